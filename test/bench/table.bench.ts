import { parse as csvParse } from "csv-parse/sync";
import { readColumns } from "../../src/data/readColumns.js";
import { median, ms, times } from "./sampling.js";

/** A million rows of two columns: our reading, csv-parse alone, and a loop that only looks at each byte. */
export async function bench(): Promise<string[]> {
  const rows = 1_000_000;
  let text = "time / s,c / mol L^-1\n";
  for (let i = 0; i < rows; i++) text += `${i / 10},${(0.1 / (1 + i * 1e-5)).toFixed(6)}\n`;
  const bytes = new TextEncoder().encode(text);
  const floor = median(
    times(5, 1, () => {
      let lines = 0;
      for (const byte of bytes) if (byte === 10) lines++;
      if (lines !== rows + 1) throw new Error("rows");
    }),
  );
  const ours = median(
    times(5, 1, () => {
      const reading = readColumns(bytes);
      if (reading.kind !== "columns" || reading.columns.rows !== rows) throw new Error("rows");
    }),
  );
  const theirs = median(times(3, 0, () => void csvParse(text)));
  return [
    `1,000,000 rows: ${ms(ours)}; csv-parse alone ${ms(theirs)}, ratio 1/${(theirs / ours).toFixed(1)} (goal 1/8); a loop over the bytes ${ms(floor)}`,
  ];
}
