import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { adjustmentsOf, type PaidWorkday, sumFigures } from "@/lib/periods/adjust";
import { makeDay } from "@/tests/make/frozen";

const day = fc
  .tuple(fc.integer({ min: 1, max: 5 }), fc.nat(36_000), fc.nat(7200), fc.nat(3600))
  .map(([on, regular, overtime, night]) =>
    makeDay(`2026-06-0${on}`, regular, { overtime, premiums: { night } }),
  );
const days = fc.uniqueArray(day, { selector: ({ date }) => date });

describe("adjustmentsOf", () => {
  test("is nothing where what was paid is what is due", () => {
    const paid = [makeDay("2026-06-01", 36_000)];
    expect(adjustmentsOf(paid, paid)).toEqual([]);
  });
  test("tells a change of bucket, though the hours are the same", () => {
    const now = [makeDay("2026-06-05", 30_000, { overtime: 6000 })];
    expect(adjustmentsOf(now, [makeDay("2026-06-05", 36_000)])).toEqual([
      makeDay("2026-06-05", -6000, { overtime: 6000 }),
    ]);
  });
  test("counts what was adjusted before, so that nothing is paid twice", () => {
    const paid = [makeDay("2026-06-01", 36_000), makeDay("2026-06-01", -3600)];
    expect(adjustmentsOf([makeDay("2026-06-01", 32_400)], paid)).toEqual([]);
  });
  test("a day that moved to another workweek is taken from the old one", () => {
    const moved = makeDay("2026-06-05", 3600, { workweek: "2026-06-05" });
    const found = adjustmentsOf([moved], [makeDay("2026-06-05", 3600)]);
    expect(found.map(({ workweek, paidSeconds }) => [workweek, paidSeconds])).toEqual([
      ["2026-05-31", -3600],
      ["2026-06-05", 3600],
    ]);
  });
  test("a premium that was never paid is owed", () => {
    const now = [makeDay("2026-06-01", 3600, { premiums: { night: 60 } })];
    expect(adjustmentsOf(now, [makeDay("2026-06-01", 3600)])[0]!.premiums).toEqual({ night: 60 });
  });
  test("for any statements, paid and adjusted together are what is due, and then nothing is left", () => {
    fc.assert(
      fc.property(days, days, (now, paid) => {
        const adjusted: PaidWorkday[] = [...paid, ...adjustmentsOf(now, paid)];
        const { workedSeconds, paidSeconds, buckets } = sumFigures(adjusted);
        const due = sumFigures(now);
        expect({ workedSeconds, paidSeconds, buckets }).toEqual({
          workedSeconds: due.workedSeconds,
          paidSeconds: due.paidSeconds,
          buckets: due.buckets,
        });
        expect(adjustmentsOf(now, adjusted)).toEqual([]);
      }),
    );
  });
});
