import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { type Owner, type StatementRow, statements } from "../../src/language/statements.js";

/** Names the examples speak of. */
const above = `reaction 2 H2O2 -> 2 H2O + O2
run Z
  volume 50.00 mL
  temperature 25.0 °C
  data "data/z.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  rate initial
`;

/** The header an example stands below, and the runs it speaks of. */
const headers: Readonly<Record<Owner, string>> = {
  file: "",
  reaction: "reaction next is H2O2 + I^- -> H2O + IO^-\n",
  species: "species dye\n",
  calibration: "calibration line of I2\n",
  run: "run B like Z\n",
  rows: 'rows of "runs.csv" like Z\n',
  data: 'run B like Z\n  data "data/b.csv"\n',
  column: 'run B like Z\n  data "data/b.csv"\n    column y "y" mol/L\n',
  follow: "calibration iodine of I2\n  slope 0.0213(2) L/µmol\nrun B like Z\n  follow H2O2 as concentration from c\n",
  observed: 'run B like Z\n  observed "blue" at 30 s\n',
  fit: "run B like Z\n  fit order 1 in H2O2\n",
  series: "run A like Z\nrun B like Z\nrun A1 like Z\nrun A2 like Z\nseries s\n",
  mechanism: "run A like Z\nrun B like Z\nmechanism m\n",
  step: "mechanism m\n  step fast is H2O2 + I^- -> H2O + IO^-\n",
};

/** Lines that stand together in one description. */
const together = 8;

/** The examples of the table put together into short descriptions, each below a header that owns it. */
function descriptionsOfExamples(): string[] {
  return (Object.keys(headers) as Owner[]).flatMap((owner) => {
    const rows = statements.filter(
      (row) => row.owners.includes(owner) && (owner !== "file" || !row.owners.includes("run")),
    );
    return chunks(rows).map((some) => {
      const lines = some.filter(({ head }) => head !== "ratewright").map(({ example }) => `    ${example}\n`);
      const version = some.find(({ head }) => head === "ratewright");
      return `${version === undefined ? "" : `${version.example}\n`}${above}${headers[owner]}${lines.join("")}`;
    });
  });
}

function chunks(rows: readonly StatementRow[]): StatementRow[][] {
  const found: StatementRow[][] = [];
  for (let at = 0; at < rows.length; at += together) found.push(rows.slice(at, at + together));
  return found;
}

function samples(): string[] {
  return readdirSync("samples")
    .filter((name) => name.endsWith(".raterun"))
    .map((name) => readFileSync(join("samples", name), "utf8"));
}

/** What is declared stands below what uses it, as the language allows. */
const upsideDown = `run A
  volume 50.00 mL
  temperature 25.0 °C
  taken ester 1.00 g
  data "data/a.csv"
    column t "t / s"
    column a "A"
  follow ester as absorbance from a
    calibrated by line
  rate initial
series s
  across A, A2
  order in ester
run A2 like A
calibration line of ester
  slope 0.0213(2) L/µmol
species ester is C4H8O2
reaction ester + H2O -> C2H5OH + CH3COOH
results in mmol/L, min
`;

/** All samples, and descriptions in which every example of the language stands. The mistakes planted in one sample are its own. */
export const descriptions: readonly string[] = [...samples(), ...descriptionsOfExamples(), upsideDown];
