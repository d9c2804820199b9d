import { describe, expect, test } from "vitest";
import { kioskTicket } from "@/lib/kiosks/schema";
import { kioskTicketOf } from "@/lib/kiosks/ticket-view";
import { afterEight, makeBook, makeOperation, makeReport, makeWork } from "@/tests/make/book";
import { siteRules } from "@/tests/make/events";

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
});
