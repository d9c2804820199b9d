import { describe, expect, test } from "vitest";
import {
  attendanceKey,
  operationDayKey,
  readCellDays,
  readOperationDays,
  readStandardKey,
  standardKey,
} from "@/lib/matching/mark-keys";
import { UNKNOWN } from "@/lib/matching/parts";
import { siteRules } from "@/tests/make/events";

const rules = [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 360 }];

describe("operationDayKey, readOperationDays", () => {
  test("each once, in order, also where a code holds blanks", () => {
    const [one, other] = [
      { day: "2026-05-14", operation: "010" },
      { day: "2026-05-13", operation: "final  set-up" },
    ];
    expect(readOperationDays([one, other, one].map(operationDayKey))).toEqual([other, one]);
  });
});

describe("standardKey, readStandardKey", () => {
  test("give back what was written", () => {
    const key = { modelId: UNKNOWN, from: "2026-05-14", operation: "a b" };
    expect(readStandardKey(standardKey(key))).toEqual(key);
  });
});

describe("attendanceKey, readCellDays", () => {
  const at = (day: number, hour: number) => Date.UTC(2026, 4, day, hour);
  const read = (...stretches: Parameters<typeof attendanceKey>[0][]) =>
    readCellDays(stretches.map(attendanceKey), rules).map(({ day, cell }) => `${day} ${cell}`);

  test("the production days that time touches, each once a cell", () => {
    const cell = "mill";
    expect(
      read(
        { startMs: at(14, 5), endMs: at(14, 7), cell },
        { startMs: at(14, 6), endMs: at(15, 6), cell },
        { startMs: at(14, 6), endMs: at(14, 7), cell: null },
      ),
    ).toEqual(["2026-05-13 mill", `2026-05-14 ${UNKNOWN}`, "2026-05-14 mill"]);
  });
  test("brings the bounds of the day", () => {
    const [found] = readCellDays(
      [attendanceKey({ startMs: at(14, 7), endMs: at(14, 8), cell: "c" })],
      rules,
    );
    expect(found).toMatchObject({ start: at(14, 6) / 1000, end: at(15, 6) / 1000 });
  });
});
