import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { exp } from "../../src/numerics/elementary.js";
import { seededRandom } from "../../src/numerics/random.js";
import { median, ms, times } from "./sampling.js";

/** The whole process of `report` on a run of 50 readings, against a Node that does nothing. */
export async function bench(): Promise<string[]> {
  const folder = mkdtempSync(join(tmpdir(), "ratewright-bench-"));
  try {
    const random = seededRandom(1);
    const rows = Array.from(
      { length: 50 },
      (_, i) => `${12 * i},${0.1 * exp(-0.004 * 12 * i) + 3e-4 * random.normal()}`,
    );
    writeFileSync(join(folder, "a.csv"), `t / s,c / mol/L\n${rows.join("\n")}\n`);
    writeFileSync(
      join(folder, "a.raterun"),
      `reaction 2 H2O2 -> 2 H2O + O2
run A
  temperature 25 °C
  taken H2O2 0.1 mol/L
  data "a.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  rate initial
  fit order 1 in H2O2
`,
    );
    const command = join(process.cwd(), "dist", "ratewright.cjs");
    const run = (args: readonly string[]) => () => {
      const done = spawnSync(process.execPath, [...args], { cwd: folder, encoding: "utf8" });
      if (done.status !== 0) throw new Error(`${args.join(" ")}: ${done.stderr}`);
    };
    const bare = median(times(15, 2, run(["-e", "0"])));
    const lines = [`node -e 0: ${ms(bare)}`];
    for (const args of [["report"], ["report", "--json"], ["check"]]) {
      const whole = median(times(15, 2, run([command, ...args, "a.raterun"])));
      lines.push(
        `ratewright ${args.join(" ")}: ${ms(whole)}, ${(whole / bare).toFixed(2)} × node -e 0; goal 2, later 1.7`,
      );
    }
    return lines;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
