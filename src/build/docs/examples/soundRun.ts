/** A run without fault, to which the examples that need readings do something. The figures are invented. */
export const soundRun = `reaction 2 H2O2 -> 2 H2O + O2
run A
  temperature 25.0 °C
  taken H2O2 0.100 mol/L
  data "data/a.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  fit order 1 in H2O2
`;

/** Its readings: some four half-lives. */
export const soundFile = `t / s,c / mol/L
0,0.1003
20,0.0749
40,0.0551
60,0.0404
80,0.0303
100,0.0221
120,0.0167
140,0.0120
`;

export const soundFiles = { "data/a.csv": soundFile };

/** The sound run with some words changed. */
export function runWith(words: string, instead: string): string {
  if (!soundRun.includes(words)) throw new Error(`“${words}” does not stand in the sound run`);
  return soundRun.replace(words, () => instead);
}

/** The sound file with times of another form in place of its seconds. */
export function timedFile(header: string, time: (clock: string, index: number) => string): string {
  let index = 0;
  return soundFile
    .replace("t / s", header)
    .replace(/^(\d+),/gm, (_, seconds) => `${time(clockText(Number(seconds)), index++)},`);
}

/** Seconds as a clock shows them, from nought. */
export function clockText(seconds: number): string {
  const two = (part: number): string => String(part).padStart(2, "0");
  return `00:${two(Math.floor(seconds / 60))}:${two(seconds % 60)}`;
}

/** The sound file, under its path, with some words changed. */
export function fileWith(words: string, instead: string): Readonly<Record<string, string>> {
  if (!soundFile.includes(words)) throw new Error(`“${words}” does not stand in the sound file`);
  return { "data/a.csv": soundFile.replace(words, () => instead) };
}
