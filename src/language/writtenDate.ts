/** A date written another way: year first with other signs, or day and month first, which can be either. */
export function otherDates(text: string): string[] {
  const [a = "", b = "", c = "", ...rest] = text.split(/[./-]/);
  if (rest.length > 0 || ![a, b, c].every((part) => /^\d+$/.test(part))) return [];
  const dates =
    a.length === 4
      ? [[a, b, c]]
      : text.includes(".")
        ? [[c, b, a]]
        : [
            [c, b, a],
            [c, a, b],
          ];
  const written = dates.map((parts) => parts.map((part) => part.padStart(2, "0")).join("-"));
  return [...new Set(written)].filter(isDate);
}

/** Whether a text is a day of the calendar, year first. */
export function isDate(text: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
  const [year, month, day] = text.split("-").map(Number) as [number, number, number];
  const days = [
    31,
    (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0 ? 29 : 28,
    31,
    30,
    31,
    30,
    31,
    31,
    30,
    31,
    30,
    31,
  ];
  return month >= 1 && month <= 12 && day >= 1 && day <= (days[month - 1] ?? 0);
}
