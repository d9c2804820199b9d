import { describe, expect, test } from "vitest";
import { decideBooking } from "@/lib/ledger/decide-booking";
import {
  LEAD_ID,
  LEAD_SESSION,
  makeClockEvent,
  makeContext,
  makeRecord,
  RECEIVED_MS,
  WORKER_ID,
} from "@/tests/make/context";
import { eventId } from "@/tests/make/events";

const batch = { kioskId: "k", isRevoked: false, receivedMs: RECEIVED_MS, proved: [] };
const start = makeClockEvent(1, 60, { kind: "shift-start" });
const end = makeClockEvent(2, 30, { kind: "shift-end" });
const records = (...events: Parameters<typeof makeRecord>[0][]) =>
  events.map((one) => makeRecord(one));

describe("decideBooking", () => {
  test("derives the worker's timeline with the batch, and says what changes", () => {
    const decided = decideBooking(records(start, end), makeContext(), batch);
    const [timeline] = decided.timelines;
    expect(timeline).toMatchObject({ workerId: WORKER_ID, isTouched: true });
    expect(timeline?.window.events.map(({ id }) => id)).toEqual([start.id, end.id]);
    expect(timeline?.derived.shifts.changed).toMatchObject([{ endEventId: end.id }]);
    expect(timeline?.derived.asOfMs).toBe(RECEIVED_MS);
    expect([...decided.lastOf]).toEqual([[WORKER_ID, 1]]);
  });

  test("answers a record with the questions that the fold hangs on it", () => {
    const lonely = makeClockEvent(3, 20, { kind: "indirect", code: "cleaning" });
    const { results } = decideBooking(records(lonely), makeContext(), batch);
    expect(results).toEqual([{ id: lonely.id, verdict: "booked", looseEnds: ["implied-start"] }]);
  });

  test("asks about an act after its session was over, and books it", () => {
    const late = makeClockEvent(3, 20, { kind: "indirect", code: "cleaning" });
    const { results, rows, timelines } = decideBooking(
      records(start, end, late),
      makeContext(),
      batch,
    );
    expect(results[2]?.looseEnds).toEqual(["session-late", "implied-start", "rest-short"]);
    expect(rows[2]?.questions).toEqual(["session-late"]);
    expect(timelines[0]?.derived.looseEnds.changed.map(({ code }) => code)).toContain(
      "session-late",
    );
  });

  test("lets an undo of the shift's end come ten seconds later", () => {
    const undo = makeClockEvent(3, 30 - 9 / 60, { kind: "undo", event: end.id });
    const { results, timelines } = decideBooking(records(start, end, undo), makeContext(), batch);
    expect(results[2]).toMatchObject({ verdict: "booked", looseEnds: [] });
    expect(timelines[0]?.derived.folded.standing).not.toBeNull();
  });

  test("a lead's session needs no shift, and holds sixteen hours", () => {
    const settle = makeClockEvent(
      4,
      5,
      { kind: "void", event: start.id },
      { by: "2001", session: LEAD_SESSION },
    );
    const { results } = decideBooking(records(start, end, settle), makeContext(), batch);
    expect(results[2]).toMatchObject({ verdict: "booked", looseEnds: [] });
    const old = makeContext({
      sessions: makeContext().sessions.map((one) => ({
        ...one,
        openedMs: one.openedMs - 14 * 3_600_000,
      })),
    });
    expect(decideBooking(records(start, settle), old, batch).results[1]?.looseEnds).toEqual([
      "session-late",
    ]);
  });

  describe("sessions that are proved by what came along", () => {
    const fresh = eventId(8009);
    const tapped = { ...start, session: fresh };
    const proved = [{ session: fresh, worker: "1042", sealedHash: "h" }];

    test("are opened at their first record, and prove it", () => {
      const decided = decideBooking(records(tapped), makeContext(), { ...batch, proved });
      expect(decided.results[0]?.verdict).toBe("booked");
      expect(decided.sessions).toEqual([
        { id: fresh, workerId: WORKER_ID, sealedHash: "h", openedMs: RECEIVED_MS - 3_600_000 },
      ]);
    });

    test("prove nothing for another worker", () => {
      const others = [{ session: fresh, worker: "2001", sealedHash: "h" }];
      const decided = decideBooking(records(tapped), makeContext(), { ...batch, proved: others });
      expect(decided.results[0]?.looseEnds).toEqual(["unproved"]);
      expect(decided.sessions).toMatchObject([{ workerId: LEAD_ID }]);
    });

    test("are left alone where they are known, or nothing was made with them", () => {
      const known = [{ session: start.session, worker: "1042", sealedHash: "h" }];
      expect(
        decideBooking(records(start), makeContext(), { ...batch, proved: known }).sessions,
      ).toEqual([]);
      expect(decideBooking(records(start), makeContext(), { ...batch, proved }).sessions).toEqual(
        [],
      );
    });
  });

  test("shows no bench of a worker whose records prove nothing", () => {
    const decided = decideBooking(records(start), makeContext({ sessions: [] }), batch);
    expect([...decided.lastOf]).toEqual([]);
    expect(decided.timelines[0]?.isTouched).toBe(false);
  });
});
