import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { ticketParts } from "@/lib/matching/ticket-parts";
import { sum } from "@/lib/sum";
import { makeBook, makeReport, makeWork } from "@/tests/make/book";
import { makeParts, matchingFacts } from "@/tests/make/matching";

describe("ticketParts: over", () => {
  test("an unfinished operation past the standard of its whole lot is over it", () => {
    expect(makeParts({ work: [makeWork(0, 2400)] }).over).toEqual([]);
    expect(makeParts({ work: [makeWork(0, 2401)] }).over).toEqual([
      { operation: "010", cell: "mill", standardSeconds: 2400, actualSeconds: 2401 },
    ]);
  });
  test("a finished one is not", () => {
    const records = { work: [makeWork(0, 9999)], reports: [makeReport(9999)] };
    expect(makeParts(records).over).toEqual([]);
  });
});

const cell = fc.constantFrom("mill", "neck", null);
const operation = fc.constantFrom("010", "020", "990");
const work = fc
  .record({
    at: fc.nat(300_000),
    seconds: fc.integer({ min: 1, max: 20_000 }),
    operation,
    cell,
    activity: fc.constantFrom("setup", "run", "rework", "inspect"),
  })
  .map(({ at, seconds, ...other }) => makeWork(at, seconds, other));
const report = fc
  .record({
    at: fc.nat(300_000),
    operation,
    cell,
    good: fc.nat(3),
    rework: fc.nat(1),
    scrap: fc.nat(1),
    causedBy: fc.constantFrom("010", "020", null),
    kind: fc.constantFrom("report", "inspect"),
  })
  .map(({ at, ...other }) => makeReport(at, other));

describe("ticketParts: laws", () => {
  test("for any records, no second is lost, and both bases earn the same of what is finished", () => {
    const some = fc.tuple(
      fc.array(work, { maxLength: 12 }),
      fc.uniqueArray(report, { maxLength: 10, selector: ({ event }) => event }),
      fc.boolean(),
    );
    fc.assert(
      fc.property(some, ([times, counts, isWhenBooked]) => {
        const known = { ...makeBook().known!, quantity: 4 };
        const book = makeBook({ known, work: times, reports: counts });
        const whenBooked = new Set(isWhenBooked ? ["010"] : []);
        const { booked, matched } = ticketParts(book, { ...matchingFacts, whenBooked });
        const time = booked.filter(({ activity }) => activity !== "earned");
        expect(sum(time.map(({ seconds }) => seconds))).toBe(
          sum(times.map(({ seconds }) => seconds!)),
        );
        for (const code of ["010", "020"]) {
          const finished = matched.filter((one) => one.operation === code && one.rework === "");
          const earned = booked.filter(
            (one) => one.operation === code && one.activity === "earned",
          );
          if (finished.length === 0) continue;
          const total = sum(earned.map(({ seconds }) => seconds));
          expect(sum(finished.map((one) => one.earnedSeconds))).toBe(total);
          expect(sum(finished.map((one) => one.reportEarnedSeconds))).toBe(total);
        }
        const all = sum(times.map((one) => one.seconds!));
        expect(sum(matched.map(({ actualSeconds }) => actualSeconds))).toBeLessThanOrEqual(all);
      }),
    );
  });
});
