import { describe, expect, test } from "vitest";
import { decideBatch } from "@/lib/ledger/decide";
import {
  makeClockEvent,
  makeContext,
  makeRecord,
  RECEIVED_MS,
  WORKER_ID,
} from "@/tests/make/context";
import { eventId } from "@/tests/make/events";

const batch = { kioskId: "k", isRevoked: false, receivedMs: RECEIVED_MS };
const start = makeClockEvent(1, 60, { kind: "shift-start" });
const item = { ticket: "26000017", operation: "010" };
const work = makeClockEvent(
  2,
  50,
  { kind: "work", activity: "run", items: [item] },
  { note: "late" },
);
const decide = (records: Parameters<typeof decideBatch>[0], context = makeContext()) =>
  decideBatch(records, context, batch);

describe("decideBatch", () => {
  test("books each record in the order sent, with its cell, its weights and its note apart", () => {
    const [first, second] = decide([makeRecord(start), makeRecord(work)]);
    expect(first).toMatchObject({
      id: start.id,
      verdict: "booked",
      looseEnds: [],
      worker: WORKER_ID,
    });
    expect(second?.row).toMatchObject({
      kind: "work",
      workerId: WORKER_ID,
      atMs: RECEIVED_MS - 50 * 60_000,
      cellId: "mill",
      weights: [2400],
      note: "late",
      body: { kind: "work", v: 1, clock: work.clock },
    });
    expect(JSON.stringify(second?.row?.body)).not.toContain("late");
    expect(second?.added).toMatchObject({ id: work.id, weights: [2400], kiosk: "k", by: null });
    expect(second?.added?.body).toEqual({ kind: "work", activity: "run", items: [item] });
  });

  test("one bad record costs no other, and is kept under the id of its bytes", () => {
    const [bad, good] = decide([makeRecord(null), makeRecord(start)]);
    expect(bad).toMatchObject({
      id: eventId(7000),
      verdict: "looseEnd",
      looseEnds: ["unreadable"],
      row: { kind: "unreadable", keptFor: "unreadable", body: { raw: "null" }, atMs: null },
      added: null,
    });
    expect(good?.verdict).toBe("booked");
  });

  describe("what is known already", () => {
    const hash = makeRecord(start).hash;
    const known = [{ id: start.id, bodyHash: hash, keptFor: null, questions: ["session-late"] }];

    test("is a duplicate, with what was said of it, and nothing is written", () => {
      const [again] = decide([makeRecord(start)], makeContext({ known }));
      expect(again).toMatchObject({
        verdict: "duplicate",
        looseEnds: ["session-late"],
        row: null,
        isProved: true,
      });
    });

    test("is one within a batch too", () => {
      expect(decide([makeRecord(start), makeRecord(start)]).map(({ verdict }) => verdict)).toEqual([
        "booked",
        "duplicate",
      ]);
    });

    test("with other content is a clash: kept under another id, answered under its own", () => {
      const [clash] = decide([makeRecord(start, "other")], makeContext({ known }));
      expect(clash).toMatchObject({
        id: start.id,
        verdict: "looseEnd",
        looseEnds: ["id-clash"],
        row: { id: eventId(7000), keptFor: "id-clash" },
      });
    });

    test("a clash that comes again is a duplicate", () => {
      const kept = { id: eventId(7000), bodyHash: "other", keptFor: "id-clash", questions: null };
      const context = makeContext({ known: [...known, kept] });
      const [again] = decide([makeRecord(start, "other")], context);
      expect(again).toMatchObject({
        verdict: "duplicate",
        looseEnds: ["id-clash"],
        isProved: false,
      });
    });
  });

  test("keeps what is not proved, without an event for the fold", () => {
    const [one] = decide([makeRecord(start)], makeContext({ sessions: [] }));
    expect(one).toMatchObject({ verdict: "looseEnd", looseEnds: ["unproved"], added: null });
    expect(one?.row?.keptFor).toBe("unproved");
  });

  test("asks where nobody knows how far off the tablet's clock was", () => {
    const unmeasured = makeClockEvent(3, 5, { kind: "shift-start" });
    unmeasured.clock = { ...unmeasured.clock, offsetMs: null, boot: "another run" };
    const [one] = decide([makeRecord(unmeasured)]);
    expect(one).toMatchObject({ verdict: "booked", looseEnds: ["clock-unmeasured"] });
    expect(one?.added?.questions).toEqual(["clock-unmeasured"]);
  });
});
