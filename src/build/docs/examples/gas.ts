import type { CodeExamples } from "../codeExample.js";

/** A run whose gas is collected, without fault. */
const soundGas = `reaction 2 H2O2 -> 2 H2O + O2
run A
  volume 50.00 mL
  temperature 25.0 °C
  data "data/gas.csv"
    column t "t / s"
    column gas "V / mL"
  follow O2 as gas volume from gas
    collected wet at 22.0 °C
    barometer 100.8 kPa
  fit order 1 in H2O2
`;

/** Its readings: six half-lives. */
const files = {
  "data/gas.csv": `t / s,V / mL
0,0.0
60,18.2
120,30.8
180,39.9
240,46.1
300,50.4
360,53.4
480,57.0
600,58.7
`,
};

const without = (words: string): string => soundGas.replace(words, "");

export const gasExamples: CodeExamples = {
  "gas-lacks-collected": { text: without("    collected wet at 22.0 °C\n"), files },
  "gas-lacks-barometer": { text: without("    barometer 100.8 kPa\n"), files },
  "gas-lacks-volume": {
    text: without("  volume 50.00 mL\n"),
    files,
    write: ["  temperature", "  volume 50.00 mL\n  temperature"],
  },
  "gas-no-pressure": {
    text: soundGas.replace("22.0 °C", "102.0 °C"),
    files,
    write: ["102.0 °C", "22.0 °C"],
  },
  "gas-dissolves": {
    text: soundGas.replace("50.00 mL", "500.0 mL"),
    files,
    write: ["500.0 mL", "50.00 mL"],
  },
};
