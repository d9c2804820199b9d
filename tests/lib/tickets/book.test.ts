import { describe, expect, test } from "vitest";
import { judgeBook } from "@/lib/tickets/book";
import { afterEight, makeBook, makeReport, makeWork } from "@/tests/make/book";

describe("judgeBook", () => {
  test("judges a ticket by what is booked to it", () => {
    const book = makeBook({ work: [makeWork(0, 900)], reports: [makeReport(900)] });
    const { status, operations } = judgeBook(book, null);
    expect(status).toBe("open");
    expect(operations).toMatchObject([
      { state: "finished", actualSeconds: 900, good: 1, finishedMs: afterEight(900) },
      { state: "ready", actualSeconds: 0 },
    ]);
  });

  test("counts time that runs until the instant asked for, by fair share, or not at all", () => {
    const book = makeBook({ work: [makeWork(0, null, { weights: [1, 3], item: 1 })] });
    const seconds = (untilMs: number | null) =>
      judgeBook(book, untilMs).operations[0]?.actualSeconds;
    expect(seconds(afterEight(100))).toBe(75);
    expect(seconds(afterEight(-5))).toBe(0);
    expect(seconds(null)).toBe(0);
  });

  test("asks about everything that is booked to a number that is no ticket's", () => {
    const book = makeBook({
      known: null,
      operations: [],
      work: [makeWork(0, 60)],
      reports: [makeReport(90)],
    });
    const { looseEnds, operations } = judgeBook(book, null);
    expect(operations).toEqual([]);
    expect(looseEnds.map(({ code }) => code)).toEqual(["unknown-ticket"]);
  });

  test("leaves a cancelled ticket cancelled", () => {
    const { known } = makeBook();
    expect(judgeBook(makeBook({ known: { ...known!, status: "cancelled" } }), null).status).toBe(
      "cancelled",
    );
  });

  test("takes an answered question for answered", () => {
    const work = [makeWork(0, 60, { operation: "020", cell: "neck" })];
    const [asked] = judgeBook(makeBook({ work }), null).looseEnds;
    expect(asked).toMatchObject({ code: "out-of-order", settled: false });
    const settled = [`${asked?.code}:${asked?.subject}`];
    expect(judgeBook(makeBook({ work, settled }), null).looseEnds[0]?.settled).toBe(true);
  });
});
