import { describe, expect, test } from "vitest";
import { kioskTicket } from "@/lib/kiosks/schema";
import { kioskTicketOf } from "@/lib/kiosks/ticket-view";
import { afterEight, makeBook, makeOperation, makeReport, makeWork } from "@/tests/make/book";
import { siteRules } from "@/tests/make/events";
import { makeSaidAct } from "@/tests/make/sheet";

const from = { cells: ["mill"], rules: [siteRules], atMs: afterEight(100) };

describe("kioskTicketOf", () => {
  test("shows where each operation stands, and what stands in its way here", () => {
    const ticket = kioskTicketOf(makeBook({ work: [makeWork(0, null)] }), from);
    expect(kioskTicket.parse(ticket)).toMatchObject({
      ticket: "26000017",
      model: "Heron",
      options: ["Sunburst"],
      status: "open",
      dueOn: "2026-06-01",
      operations: [
        {
          operation: "010",
          cell: "The mill",
          state: "working",
          here: true,
          obstacles: [],
          actualSeconds: 100,
          workers: [{ worker: "1042", name: "Ilo Varn" }],
          setupSeconds: 600,
          runSeconds: 1800,
          setupEarned: false,
          openQuantity: 1,
        },
        {
          operation: "020",
          here: false,
          obstacles: ["wrong-cell", "predecessor-open"],
          workers: [],
        },
      ],
    });
  });

  test("is fresh right after a count, whatever was last kept", () => {
    const ticket = kioskTicketOf(makeBook({ reports: [makeReport(50)] }), from);
    expect(ticket?.operations.map(({ state }) => state)).toEqual(["finished", "ready"]);
    expect(ticket?.operations[0]?.obstacles).toEqual(["finished"]);
  });

  test("leaves out what runs in a copy that is kept", () => {
    const book = makeBook({ work: [makeWork(0, 30), makeWork(30, null)] });
    expect(kioskTicketOf(book, { ...from, isToKeep: true })?.operations[0]?.actualSeconds).toBe(30);
  });

  test("names nobody twice who is on it with two items", () => {
    const work = [makeWork(0, null), makeWork(0, null, { item: 1 })];
    expect(kioskTicketOf(makeBook({ work }), from)?.operations[0]?.workers).toHaveLength(1);
  });

  test("says null where no standard is set, and takes the one of the first work's day", () => {
    const standards = [
      { seq: 1, option: null, effectiveFrom: "2026-05-14", setupSeconds: 5, runSeconds: 7 },
      { seq: 2, option: null, effectiveFrom: "2026-05-13", setupSeconds: 4, runSeconds: 6 },
    ];
    const one = { ...makeOperation("010", "mill"), standards };
    const none = { ...makeOperation("020", "neck"), standards: [] };
    const operations = [one, none];
    const yesterday = [makeWork(-86_400, 60)];
    const shown = (book: Partial<ReturnType<typeof makeBook>>) =>
      kioskTicketOf(makeBook({ operations, ...book }), from)?.operations.map(
        ({ runSeconds }) => runSeconds,
      );
    expect(shown({})).toEqual([7, null]);
    expect(shown({ work: yesterday })).toEqual([6, null]);
    expect(shown({ reports: [makeReport(-86_400)] })).toEqual([6, null]);
  });

  test("is null for a number that is no ticket's", () => {
    expect(kioskTicketOf(makeBook({ known: null, operations: [] }), from)).toBeNull();
  });

  test("an operation that is built in steps has its sheet, whose seconds sum to its actual", () => {
    const steps = [{ operation: "010", step: "1", name: "Dry-fit", seconds: 300 }];
    const done = makeSaidAct(
      0,
      { kind: "step-done", ticket: "26000017", operation: "010", step: "1" },
      { atMs: afterEight(40) },
    );
    const stepped = { ticket: "26000017", steps, said: [done] };
    const book = makeBook({ work: [makeWork(0, 30), makeWork(60, null)] });
    const [first, second] = kioskTicketOf(book, from, stepped)?.operations ?? [];
    expect(first?.sheet).toMatchObject({
      steps: [{ step: "1", state: "done", actualSeconds: 30, standardSeconds: 2400 }],
      notTappedSeconds: 40,
    });
    expect(first?.actualSeconds).toBe(70);
    expect(second?.sheet).toBeUndefined();
  });

  test("time on a rework operation is not the sheet's, as it is not the operation's", () => {
    const steps = [{ operation: "010", step: "1", name: "Dry-fit", seconds: 300 }];
    const stepped = { ticket: "26000017", steps, said: [] };
    const failed = makeReport(70, { operation: "020", good: 0, rework: 1, causedBy: "010" });
    const book = makeBook({
      work: [makeWork(0, 50), makeWork(80, 20, { activity: "rework" })],
      reports: [makeReport(50), failed],
    });
    const [first] = kioskTicketOf(book, from, stepped)?.operations ?? [];
    expect(first?.actualSeconds).toBe(50);
    expect(first?.sheet?.notTappedSeconds).toBe(50);
  });
});
