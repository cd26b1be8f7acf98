import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { dirname, join, normalize, relative, sep } from "node:path";

/** What each room may use besides itself and `contract`; `extension` and `preview` and the rest as in DEVELOPERS.md. */
const upTo = {
  study: ["quantity", "chemistry"],
  language: ["study", "quantity", "chemistry"],
  data: ["quantity"],
  monitor: ["study", "data", "quantity", "chemistry", "numerics"],
} as const;

const mayUse: Readonly<Record<string, readonly string[]>> = {
  contract: [],
  quantity: [],
  numerics: [],
  chemistry: ["quantity"],
  ...upTo,
  law: ["numerics", "study"],
  analysis: ["monitor", "law", "data", "study", "chemistry", "numerics", "quantity"],
  report: ["quantity"],
  record: [],
  workspace: [
    "analysis",
    "law",
    "monitor",
    "data",
    "language",
    "study",
    "chemistry",
    "numerics",
    "quantity",
    "report",
    "record",
  ],
  host: [],
  server: [
    "host",
    "workspace",
    "analysis",
    "law",
    "monitor",
    "data",
    "language",
    "study",
    "chemistry",
    "numerics",
    "quantity",
    "report",
    "record",
  ],
  cli: [
    "host",
    "workspace",
    "analysis",
    "law",
    "monitor",
    "data",
    "language",
    "study",
    "chemistry",
    "numerics",
    "quantity",
    "report",
    "record",
  ],
  extension: ["report"],
  preview: [],
  build: ["workspace", "language", "quantity", "numerics", "report"],
};

/** Rooms that know no file system, editor or clock. */
const pure = [
  "contract",
  "quantity",
  "numerics",
  "chemistry",
  "study",
  "language",
  "data",
  "monitor",
  "law",
  "analysis",
  "report",
  "record",
  "workspace",
];

const files = readdirSync("src", { recursive: true, encoding: "utf8" })
  .filter((name) => name.endsWith(".ts"))
  .map((name) => ({ name: name.split(sep).join("/"), text: readFileSync(join("src", name), "utf8") }));

const importsOf = (text: string): string[] =>
  [...text.matchAll(/^(?:import|export)\b[^;]*?from "([^"]+)";/gms)].map(([, path]) => path ?? "");
const roomOf = (name: string): string => name.split("/")[0] ?? "";

/** Files of src/ that a file imports, by their names below src/. */
const inside = ({ name, text }: { name: string; text: string }): string[] =>
  importsOf(text)
    .filter((path) => path.startsWith("."))
    .map((path) => normalize(join("src", dirname(name), path)))
    .map((path) => relative("src", path).split(sep).join("/").replace(/\.js$/, ".ts"));

describe("the rooms of the house", () => {
  it("there are files to look at, and every room has its row", () => {
    assert.ok(files.length > 100);
    for (const { name } of files) assert.ok(roomOf(name) in mayUse, name);
  });

  it("every import stays in its row", () => {
    for (const file of files) {
      for (const target of inside(file)) {
        const [from, to] = [roomOf(file.name), roomOf(target)];
        assert.ok(from === to || to === "contract" || mayUse[from]?.includes(to), `${file.name} uses ${target}`);
      }
    }
  });

  it("every import leads to a file, and no chain of imports comes back", () => {
    const graph = new Map(files.map((file) => [file.name, inside(file)]));
    const done = new Set<string>();
    const visit = (name: string, path: readonly string[]): void => {
      assert.ok(!path.includes(name), `${[...path, name].join(" -> ")}`);
      if (done.has(name)) return;
      const targets = graph.get(name);
      assert.ok(targets !== undefined, `${path.at(-1)} imports ${name}, which is not there`);
      for (const target of targets) visit(target, [...path, name]);
      done.add(name);
    };
    for (const name of graph.keys()) visit(name, []);
    assert.equal(done.size, files.length);
  });

  it("nothing down to workspace/ knows a file system, an editor or a clock", () => {
    for (const { name, text } of files) {
      if (!pure.includes(roomOf(name))) continue;
      for (const path of importsOf(text))
        assert.ok(!/^(node:|vscode($|-languageclient|-languageserver))/.test(path), `${name}: ${path}`);
      assert.ok(!/\b(Date\.now|new Date|performance\.now|setTimeout|setInterval|process\.)\b/.test(text), name);
    }
  });

  it("no `any`, no default export, no engine's own powers, exponentials and logarithms where numbers come from", () => {
    for (const { name, text } of files) {
      const code = text.replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, "").replace(/`(?:[^`\\]|\\.)*`|"(?:[^"\\]|\\.)*"/g, '""');
      assert.ok(!/[:<,|(]\s*any\b|\bas any\b/.test(code), `${name}: any`);
      assert.ok(!/export default/.test(code), `${name}: default export`);
      if (!["numerics", "law", "monitor", "analysis"].includes(roomOf(name))) continue;
      assert.ok(
        !/Math\.(pow|exp|expm1|log|log1p|log10|log2|hypot|sin|cos|tanh|cbrt)\b|\*\*/.test(code),
        `${name}: sealed functions`,
      );
    }
  });

  it("files stay small: the median under 110 lines, 9 in 10 under 400", () => {
    const lengths = files.map(({ text }) => text.split("\n").length).sort((a, b) => a - b);
    assert.ok((lengths[Math.floor(lengths.length / 2)] ?? 0) < 110);
    assert.ok((lengths[Math.floor(0.9 * lengths.length)] ?? 0) < 400);
  });
});
