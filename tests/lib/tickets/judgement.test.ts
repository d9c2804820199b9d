import { describe, expect, test } from "vitest";
import { countChanges, judgementOf } from "@/lib/tickets/judgement";
import { afterEight, makeBook, makeReport, makeWork } from "@/tests/make/book";

describe("judgementOf", () => {
  test("makes the first operation of a new ticket ready, and nothing else", () => {
    const judgement = judgementOf(makeBook());
    expect(judgement.operations.map(({ id, state }) => [id, state])).toEqual([
      ["id of 010", "ready"],
    ]);
    expect(judgement.ticket).toBeNull();
    expect(countChanges(judgement)).toBe(1);
  });

  test("changes nothing once it is kept", () => {
    const book = makeBook({ work: [makeWork(0, 60, { operation: "020", cell: "neck" })] });
    const { operations, looseEnds } = judgementOf(book);
    const kept = {
      ...book,
      operations: book.operations.map((one) => ({
        ...one,
        ...operations.find(({ id }) => id === one.id),
      })),
      looseEnds: looseEnds.changed,
    };
    expect(looseEnds.changed).toMatchObject([
      { code: "out-of-order", worker: "w1", settled: false },
    ]);
    expect(countChanges(judgementOf(kept))).toBe(0);
  });

  test("takes back a question that stands no more", () => {
    const asked = { code: "out-of-order", subject: "e0", worker: "w1", atMs: 0, settled: false };
    expect(judgementOf(makeBook({ looseEnds: [asked] })).looseEnds).toEqual({
      gone: [asked],
      changed: [],
    });
  });

  test("finishes a ticket with its last operation", () => {
    const reports = [makeReport(10), makeReport(20, { operation: "020" })];
    expect(judgementOf(makeBook({ reports })).ticket).toEqual({
      id: "id of ticket",
      status: "finished",
      finishedMs: afterEight(20),
    });
  });

  test("leaves what runs out of what is kept", () => {
    const { operations } = judgementOf(makeBook({ work: [makeWork(0, 60), makeWork(60, null)] }));
    expect(operations[0]).toMatchObject({
      state: "working",
      actualSeconds: 60,
      firstWorkMs: afterEight(0),
    });
  });

  test("keeps nothing of a number that is no ticket's but its questions", () => {
    const book = makeBook({ known: null, operations: [], work: [makeWork(0, 60)] });
    const { ticket, operations, looseEnds } = judgementOf(book);
    expect([ticket, operations]).toEqual([null, []]);
    expect(looseEnds.changed).toMatchObject([{ code: "unknown-ticket" }]);
  });
});
