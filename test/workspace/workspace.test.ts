import assert from "node:assert/strict";
import type { Description } from "../../src/contract/findings.js";
import { changedWhileRead } from "../../src/contract/messages/data.js";
import type { Reader, ReadOutcome } from "../../src/contract/reader.js";
import { exp } from "../../src/numerics/elementary.js";
import { type Computer, inlineComputer } from "../../src/workspace/computer.js";
import { createWorkspace } from "../../src/workspace/workspace.js";

const text = `reaction 2 H2O2 -> 2 H2O + O2
run A
  temperature 25 °C
  taken H2O2 0.1 mol/L
  data "../x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  fit order 1 in H2O2
`;
const rows = Array.from({ length: 20 }, (_, i) => `${10 * i},${0.1 * exp(-0.02 * 10 * i)}`);
const csv = new TextEncoder().encode(`t / s,c / mol/L\n${rows.join("\n")}\n`);
const document = { uri: "file:///lab/runs/a.raterun", text, path: "runs/a.raterun" };
const never = new AbortController().signal;

/** A workspace whose one data file is what `outcome` says, and how often it was read. */
function workspaceOf(outcome: () => ReadOutcome, { within = null as string | null, sizeLimit = 1e6 } = {}) {
  const read: string[] = [];
  const reader: Reader = {
    async read(uri) {
      read.push(uri);
      return outcome();
    },
  };
  let computed = 0;
  const inner = inlineComputer(async () => {});
  const computer: Computer = {
    compute(job, signal) {
      computed++;
      return inner.compute(job, signal);
    },
  };
  const workspace = createWorkspace({ reader, sizeLimit, within: () => within }, computer);
  return { workspace, read, computed: () => computed };
}

async function saidOf(outcome: ReadOutcome, options?: { within?: string; sizeLimit?: number }): Promise<string[]> {
  const { workspace } = workspaceOf(() => outcome, options);
  const description = await workspace.describe(document, { curves: false, signal: never });
  return description?.diagnostics.map(({ code, line, message }) => `${code}@${line}: ${message}`) ?? [];
}

const k = (description: Description | null): number | undefined =>
  description?.runs[0]?.fits[0]?.parameters["k"]?.value;

describe("a workspace", () => {
  it("reads a data file by the URI that its path means, once, and keeps what followed from it", async () => {
    const { workspace, read, computed } = workspaceOf(() => ({ kind: "bytes", bytes: csv }));
    const first = await workspace.describe(document, { curves: false, signal: never });
    const again = await workspace.describe(document, { curves: false, signal: never });
    assert.deepEqual(read, ["file:///lab/x.csv"]);
    assert.equal(computed(), 1);
    assert.equal(again, first);
    await workspace.describe({ ...document, text: `${text}# a comment\n` }, { curves: false, signal: never });
    assert.equal(read.length, 1, "another text does not read the file again");
  });

  it("a changed file is read again, and only its descriptions are named", async () => {
    let bytes = csv;
    const { workspace, read } = workspaceOf(() => ({ kind: "bytes", bytes }));
    const before = await workspace.describe(document, { curves: false, signal: never });
    assert.deepEqual(workspace.changed("file:///lab/other.csv"), []);
    bytes = new TextEncoder().encode(
      new TextDecoder().decode(csv).replaceAll(/^(\d+),/gm, (_, t) => `${2 * Number(t)},`),
    );
    assert.deepEqual(workspace.changed("file:///lab/x.csv"), [document.uri]);
    const after = await workspace.describe(document, { curves: false, signal: never });
    assert.equal(read.length, 2);
    assert.ok(Math.abs((k(before) ?? 0) / (k(after) ?? 1) - 2) < 1e-9);
    assert.notEqual(before?.data[0]?.sha256, after?.data[0]?.sha256);
    assert.equal(before?.meaning, after?.meaning);
  });

  it("stops when told to and keeps nothing half done", async () => {
    const { workspace } = workspaceOf(() => ({ kind: "bytes", bytes: csv }));
    const control = new AbortController();
    const work = workspace.describe(document, { curves: false, signal: control.signal });
    control.abort();
    assert.equal(await work, null);
    assert.ok(k(await workspace.describe(document, { curves: false, signal: never })) !== undefined);
  });

  it("a closed description lets its files go", async () => {
    const { workspace, read } = workspaceOf(() => ({ kind: "bytes", bytes: csv }));
    await workspace.describe(document, { curves: false, signal: never });
    workspace.close(document.uri);
    await workspace.describe(document, { curves: false, signal: never });
    assert.equal(read.length, 2);
  });

  it("says on the data line why a file cannot be used: data-folder, data-unreadable, data-changed-while-read, data-too-large", async () => {
    assert.deepEqual(await saidOf({ kind: "folder" }), [
      "data-folder@5: ../x.csv is a folder. Name the data file in it.",
    ]);
    assert.deepEqual(await saidOf({ kind: "unreadable", reason: "permission denied" }), [
      "data-unreadable@5: ../x.csv cannot be read: permission denied. Check who may read it, and whether another program holds it.",
    ]);
    assert.match(
      (await saidOf({ kind: "unreadable", reason: changedWhileRead })).join(),
      /^data-changed-while-read@5: \.\.\/x\.csv changed while/,
    );
    assert.match(
      (await saidOf({ kind: "too large", size: 3e6 })).join(),
      /^data-too-large@5: \.\.\/x\.csv has 3\.0 MB, more than the 1\.0 MB allowed/,
    );
  });

  it("data-path-leaves: a path that leaves the folder it must stay in is not even read", async () => {
    const { workspace, read } = workspaceOf(() => ({ kind: "bytes", bytes: csv }), { within: "file:///lab/runs" });
    const description = await workspace.describe(document, { curves: false, signal: never });
    assert.deepEqual(read, []);
    assert.deepEqual(
      description?.diagnostics.map(({ code, line }) => `${code}@${line}`),
      ["data-path-leaves@5"],
    );
    assert.deepEqual(await saidOf({ kind: "bytes", bytes: csv }, { within: "file:///lab" }), []);
  });

  it("data-path-unsaved: a description that was never saved has no folder", async () => {
    const { workspace } = workspaceOf(() => ({ kind: "bytes", bytes: csv }));
    const unsaved = { ...document, uri: "untitled:Untitled-1" };
    const description = await workspace.describe(unsaved, { curves: false, signal: never });
    assert.match(description?.diagnostics[0]?.code ?? "", /^data-path-unsaved$/);
  });

  it("limits have their words: data-line-too-long, data-too-many-columns", async () => {
    const long = new TextEncoder().encode(`t / s,c / mol/L\n1,${"9".repeat(1_100_000)}\n`);
    assert.match(
      (await saidOf({ kind: "bytes", bytes: long }, { sizeLimit: 1e8 })).join(),
      /data-line-too-long@5: \.\.\/x\.csv, line 2/,
    );
    const wide = new TextEncoder().encode(`${"a,".repeat(1_200)}b\n${"1,".repeat(1_200)}2\n`);
    assert.match((await saidOf({ kind: "bytes", bytes: wide }, { sizeLimit: 1e8 })).join(), /data-too-many-columns@5/);
  });

  it("two runs may read one file in two ways", async () => {
    const twice = `${text}run B like A
  data "../x.csv"
    skip 1 lines
    column t 1 s
    column c 2 mol/L
`;
    const { workspace } = workspaceOf(() => ({ kind: "bytes", bytes: csv }));
    const description = await workspace.describe({ ...document, text: twice }, { curves: false, signal: never });
    assert.deepEqual(
      description?.runs.map(({ follow }) => follow[0]?.points),
      [20, 20],
    );
    assert.equal(description?.data.length, 1);
  });

  it("tables of runs and runs of other files stay as they are in the study, and say so: not-computed-yet", async () => {
    const { workspace } = workspaceOf(() => ({ kind: "bytes", bytes: csv }));
    const more = `${text}rows of "runs.csv" like A
  named by "run"
  taken H2O2 from "c(H2O2) / mol/L"
series all
  across A, "more/*.raterun", "other.raterun:B"
  order in H2O2
`;
    const description = await workspace.describe({ ...document, text: more }, { curves: false, signal: never });
    assert.deepEqual(
      description?.diagnostics.map(({ code, line }) => `${code}@${line}`),
      ["not-computed-yet@10", "not-computed-yet@13"],
    );
    const { study } = workspace.bound({ ...document, text: more });
    const table = study.runs.find(({ kind }) => kind === "table");
    assert.ok(table?.kind === "table");
    assert.deepEqual(table.values, [{ head: "taken", key: "H2O2", header: "c(H2O2) / mol/L" }]);
    assert.deepEqual([table.namedBy, table.like, table.path], ["run", "A", "runs.csv"]);
    assert.deepEqual(
      study.series[0]?.across.map(({ kind }) => kind),
      ["here", "files", "file"],
    );
    assert.deepEqual(
      description?.runs.map(({ name }) => name),
      ["A"],
    );
  });
});
