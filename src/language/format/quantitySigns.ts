import { fromSuperscript, toSuperscript } from "../../quantity/plainText.js";

/** Which signs the formatter writes: those of print, those of a keyboard, or the ones that stand there. */
export type Signs = "unicode" | "ascii" | "as written";

const raised = "[⁺⁻]?[⁰¹²³⁴-⁹]+";
const digits = String.raw`(?:\d+(?:[\u2009\u202f]\d{3})*(?:\.\d+)?|\.\d+)`;
const power = String.raw`(?:[eE][-+\u2212]?\d+| ?[×xX*·] ?10(?:\^[-+\u2212]?\d+|${raised}))`;
const number = String.raw`[-+\u2212]?${digits}(?:\(\d+(?:\.\d+)?\))?${power}?`;
/** A number with its unit right behind it; neither the exponent of `5e3` nor that of `5x10^3` is a unit. */
const glued = new RegExp(String.raw`(?<=^|[ (])(${number})(?=[\p{L}%‰°º˚℃℉])(?![eE][-+\u2212]?\d|[xX] ?10)`, "gu");
const plusMinus = / *(±|\+ ?\/ ?-|\+-(?=[ .\d])) */g;
const timesTen = new RegExp(`(?<=[\\d)]) ?[×xX*·] ?10(?=\\^|${raised})`, "gu");

/**
 * A quantity or a unit with single spaces, a space before its unit, and in the signs that are asked for. Units keep
 * their style: `mol/L` and `mol L^-1` both stay what they are.
 */
export function quantitySigns(text: string, signs: Signs): string {
  const spaced = oneSpace(text).replace(plusMinus, " $1 ").replace(glued, "$1 ");
  if (signs === "as written") return spaced;
  return signs === "ascii" ? keyboard(spaced) : print(spaced);
}

/** Every gap becomes one space, but for the thin ones that group the digits of a number. */
function oneSpace(text: string): string {
  return text.replace(/\s+/g, (gap: string, at: number) => {
    const grouped = /^[\u2009\u202f]$/.test(gap) && /\d$/.test(text.slice(0, at)) && /^\s\d{3}/.test(text.slice(at));
    return grouped ? gap : " ";
  });
}

function keyboard(text: string): string {
  if (/^[ -~]*$/.test(text)) return text;
  return text
    .replace(/[\u2009\u202f]/g, "")
    .replace(/[\u2212\u2010-\u2014\ufe63\uff0d]/g, "-")
    .replace(/±/g, "+/-")
    .replace(
      new RegExp(`(?<=[\\d)]) ?[×·] ?10(?:\\^ ?\\(?([-+]?\\d+)\\)?|(${raised}))`, "gu"),
      (_, plain: string | undefined, above: string | undefined) => `e${plain ?? fromSuperscript(above ?? "0")}`,
    )
    .replace(new RegExp(raised, "gu"), (above) => `^${fromSuperscript(above)}`)
    .replace(/[\u00b5\u03bc]/g, "u")
    .replace(/[°º˚] ?/g, (sign, at: number, all: string) => (/^[CF]/.test(all.slice(at + sign.length)) ? "deg" : sign))
    .replace(/[°º˚]/g, "deg")
    .replace(/℃/g, "degC")
    .replace(/℉/g, "degF")
    .replace(/[Ω\u2126]/g, "Ohm")
    .replace(/[Å\u212b]/g, "angstrom")
    .replace(/[·\u22c5\u2219\u2022]/g, "*");
}

function print(text: string): string {
  return text
    .replace(/\+ ?\/ ?-|\+-(?=[ .\d])/g, "±")
    .replace(timesTen, "×10")
    .replace(/\^\(?([-+\u2212]?\d+)\)?(?![\d./])/g, (_, power: string) => toSuperscript(power.replace("\u2212", "-")))
    .replace(
      /(?<![\d.)\p{L}])(\p{L}+)([-\u2212]?\d+)(?![\d.\p{L}_])/gu,
      (_, symbol: string, power: string) => symbol + toSuperscript(power.replace("\u2212", "-")),
    )
    .replace(/(?<!\p{L})u(?=\p{L})|\u03bc/gu, "\u00b5")
    .replace(/(?<!\p{L})deg ?(?=[CF](?!\p{L}))|(?<!\p{L})deg(?!\p{L})|[º˚]/gu, "°")
    .replace(/℃/g, "°C")
    .replace(/℉/g, "°F")
    .replace(/Ohm(?!\p{L})|\u2126/gu, "Ω")
    .replace(/(?<!\p{L})angstrom(?!\p{L})|\u212b/gu, "Å")
    .replace(/[*\u22c5\u2219\u2022]/g, "·");
}
