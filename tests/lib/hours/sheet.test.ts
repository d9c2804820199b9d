import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type Activity, type HoursRow, hoursSheet, totalHours } from "@/lib/hours/sheet";

const activities: Activity[] = [
  "setup",
  "run",
  "rework",
  "inspect",
  "indirect",
  "rest",
  "meal",
  "unassigned",
];
const rowArb: fc.Arbitrary<HoursRow> = fc.record({
  worker: fc.constantFrom("1042", "7"),
  name: fc.constant("Ilo Varn"),
  cell: fc.constant("Mill"),
  date: fc.constantFrom("2026-05-14", "2026-05-15"),
  activity: fc.constantFrom(...activities),
  seconds: fc.nat(40_000),
  runs: fc.boolean(),
});

const row = (activity: Activity, seconds: number, more: Partial<HoursRow> = {}): HoursRow => ({
  worker: "1042",
  name: "Ilo Varn",
  cell: "Mill",
  date: "2026-05-14",
  activity,
  seconds,
  runs: false,
  ...more,
});

describe("hoursSheet", () => {
  test("gathers a worker's days, with attendance as all but meals and direct as work on tickets", () => {
    const rows = [
      row("run", 3600, { date: "2026-05-15", runs: true }),
      row("setup", 600),
      row("rework", 60),
      row("meal", 1800),
      row("rest", 300),
      row("indirect", 900),
      row("unassigned", 30),
    ];
    const [worker] = hoursSheet(rows);
    expect(worker?.days.map(({ date, runs }) => [date, runs])).toEqual([
      ["2026-05-14", false],
      ["2026-05-15", true],
    ]);
    expect(worker?.days[0]?.sums).toEqual({
      spanSeconds: 3690,
      attendanceSeconds: 1890,
      directSeconds: 660,
      indirectSeconds: 900,
      restSeconds: 300,
      mealSeconds: 1800,
      unassignedSeconds: 30,
    });
    expect(worker?.sums.directSeconds).toBe(4260);
    expect(worker?.runs).toBe(true);
  });

  test("keeps the workers in the order in which they come", () => {
    const sheet = hoursSheet([row("run", 1, { worker: "9" }), row("run", 1, { worker: "10" })]);
    expect(sheet.map(({ worker }) => worker)).toEqual(["9", "10"]);
  });

  test("is empty where nobody was in", () => {
    expect(hoursSheet([])).toEqual([]);
  });

  test("for any rows, attendance is its parts, the span adds the meals, and days make the range", () => {
    fc.assert(
      fc.property(fc.array(rowArb, { maxLength: 30 }), (rows) => {
        const sheet = hoursSheet(rows);
        for (const { sums, days } of sheet) {
          for (const some of [sums, ...days.map((day) => day.sums)]) {
            const { directSeconds, indirectSeconds, restSeconds, unassignedSeconds } = some;
            const parts = directSeconds + indirectSeconds + restSeconds + unassignedSeconds;
            expect(some.attendanceSeconds).toBe(parts);
            expect(some.spanSeconds).toBe(some.attendanceSeconds + some.mealSeconds);
          }
          const ofDays = days.reduce((all, day) => all + day.sums.spanSeconds, 0);
          expect(ofDays).toBe(sums.spanSeconds);
        }
        const total = totalHours(sheet).spanSeconds;
        expect(total).toBe(rows.reduce((all, { seconds }) => all + seconds, 0));
      }),
    );
  });
});
