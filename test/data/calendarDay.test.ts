import assert from "node:assert/strict";
import { calendarDay, dayText } from "../../src/data/calendarDay.js";

const date = (year: number, month: number, day: number) => ({ yearFirst: true, fields: [year, month, day] as const });

describe("days of the calendar", () => {
  it("are those of ECMAScript's Date, there and back", () => {
    for (let days = -350_000; days < 800_000; days += 97) {
      const [year = 0, month = 0, day = 0] = new Date(days * 86_400_000)
        .toISOString()
        .slice(0, 10)
        .split("-")
        .map(Number);
      assert.equal(calendarDay(date(year, month, day), "year first"), days);
      assert.equal(dayText(days), new Date(days * 86_400_000).toISOString().slice(0, 10));
    }
  });

  it("exist or do not", () => {
    const none = [
      [2026, 2, 29],
      [2100, 2, 29],
      [2026, 4, 31],
      [2026, 13, 1],
      [2026, 0, 1],
      [2026, 1, 0],
      [999, 1, 1],
    ] as const;
    for (const [year, month, day] of none) assert.equal(calendarDay(date(year, month, day), "year first"), null);
    for (const [year, month, day] of [
      [2028, 2, 29],
      [2000, 2, 29],
      [2026, 12, 31],
    ] as const) {
      assert.notEqual(calendarDay(date(year, month, day), "year first"), null);
    }
    assert.equal(calendarDay({ yearFirst: false, fields: [13, 11, 2026] }, "year first"), null);
    assert.equal(calendarDay({ yearFirst: false, fields: [13, 11, 2026] }, "month first"), null);
  });
});
