import { describe, expect, test } from "vitest";
import { decideOffice, type OfficeAct } from "@/lib/ledger/office";
import type { EventBody } from "@/lib/ledger/schema";
import { makeContext, makeWindow, RECEIVED_MS, WORKER_ID } from "@/tests/make/context";
import { eventId, makeEvent } from "@/tests/make/events";

const MINUTE = 60_000;
const ago = (minutes: number) => RECEIVED_MS - minutes * MINUTE;
const iso = (ms: number) => new Date(ms).toISOString();
const entry = { by: "account:a", nowMs: RECEIVED_MS };
const start = makeEvent(1, ago(120), { kind: "shift-start" });
const work = makeEvent(2, ago(90), { kind: "indirect", code: "cleaning" });
const context = makeContext({ windows: [makeWindow({ events: [start, work] })] });

function act(number: number, body: EventBody, other: Partial<OfficeAct> = {}): OfficeAct {
  return { id: eventId(number), hash: `h${number}`, worker: "1042", body, note: null, ...other };
}

const refusalOf = (acts: OfficeAct[], known = context) => {
  const decided = decideOffice(acts, known, entry);
  return decided.ok ? null : decided.problem.detail;
};

describe("decideOffice", () => {
  test("moves a tap, and the time follows at once", () => {
    const move: EventBody = { kind: "move", event: work.id, to: iso(ago(100)) };
    const decided = decideOffice([act(10, move, { note: "He said so" })], context, entry);
    const { rows, timelines } = decided.ok ? decided.value : { rows: [], timelines: [] };
    expect(rows).toMatchObject([
      {
        kind: "move",
        workerId: WORKER_ID,
        by: "account:a",
        sessionId: null,
        atMs: RECEIVED_MS,
        targetId: work.id,
        countsMs: ago(100),
        note: "He said so",
        keptFor: null,
      },
    ]);
    expect(timelines[0]?.derived.folded.segments).toMatchObject([
      { start: ago(120) / 1000, end: ago(100) / 1000 },
      { start: ago(100) / 1000, end: null, doing: { kind: "indirect" } },
    ]);
  });

  test("an entered act of work weighs by standard and belongs to the operation's cell", () => {
    const event = {
      kind: "work",
      at: iso(ago(60)),
      activity: "run",
      items: [{ ticket: "26000017", operation: "010" }],
    };
    const decided = decideOffice([act(10, { kind: "insert", event })], context, entry);
    expect(decided.ok && decided.value.rows[0]).toMatchObject({
      cellId: "mill",
      weights: [2400],
      countsMs: ago(60),
    });
  });

  test("one's own has no author, and is the worker's", () => {
    const body: EventBody = { kind: "object", subject: "2026-05-14" };
    const decided = decideOffice([act(10, body)], context, { ...entry, by: null });
    expect(decided.ok && decided.value.rows[0]).toMatchObject({ by: null, kind: "object" });
    expect(decided.ok && decided.value.timelines[0]?.derived.looseEnds.changed).toMatchObject([
      { code: "objection", subject: eventId(10), settled: false },
    ]);
  });

  test("sent twice it is written once; used for something else it is refused", () => {
    const body: EventBody = { kind: "void", event: work.id };
    const known = [{ id: eventId(10), bodyHash: "h10", keptFor: null, questions: null }];
    const again = decideOffice([act(10, body)], { ...context, known }, entry);
    expect(again).toEqual({ ok: true, value: { rows: [], timelines: [] } });
    expect(refusalOf([act(10, body, { hash: "other" })], { ...context, known })).toMatch(
      /used before/,
    );
  });

  test("a timeline that nothing is entered for is left alone", () => {
    const other = makeWindow({ workerId: "somebody" });
    const body: EventBody = { kind: "void", event: work.id };
    const decided = decideOffice(
      [act(10, body)],
      { ...context, windows: [...context.windows, other] },
      entry,
    );
    expect(decided.ok && decided.value.timelines.map(({ workerId }) => workerId)).toEqual([
      WORKER_ID,
    ]);
  });

  describe("refuses in words", () => {
    test("a worker whom nobody knows", () => {
      const lost = act(10, { kind: "void", event: work.id }, { worker: "77" });
      expect(refusalOf([lost])).toMatch(/77 is no worker here/);
    });
    test("a time that is still to come", () => {
      const to = iso(RECEIVED_MS + 2 * MINUTE);
      expect(refusalOf([act(10, { kind: "move", event: work.id, to })])).toMatch(/still to come/);
      expect(
        refusalOf([act(10, { kind: "insert", event: { kind: "shift-end", at: to } })]),
      ).toMatch(/still to come/);
    });
    test("a record of somebody else", () => {
      expect(refusalOf([act(10, { kind: "void", event: eventId(99) })])).toMatch(
        /not this worker's/,
      );
    });
    test("a record that was taken out", () => {
      const gone = makeEvent(3, ago(80), { kind: "void", event: work.id }, { by: "2001" });
      const events = [start, work, gone];
      const after = { ...context, windows: [makeWindow({ events })] };
      expect(refusalOf([act(10, { kind: "void", event: work.id })], after)).toMatch(/taken out/);
    });
    test("a question that was answered", () => {
      const end = `no-shift-end:${start.id}`;
      const answer = makeEvent(3, ago(80), { kind: "settle", end, answer: "accept" });
      const after = { ...context, windows: [makeWindow({ events: [start, work, answer] })] };
      expect(refusalOf([act(10, { kind: "settle", end, answer: "accept" })], after)).toMatch(
        /settled this meanwhile/,
      );
      expect(refusalOf([act(10, { kind: "settle", end, answer: "accept" })])).toBeNull();
    });
    test("a record that cannot be entered", () => {
      const event = { kind: "undo", at: iso(ago(5)), event: work.id };
      expect(refusalOf([act(10, { kind: "insert", event })])).toMatch(/cannot be entered/);
    });
  });
});
