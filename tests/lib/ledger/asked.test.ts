import { describe, expect, test } from "vitest";
import { askedBy } from "@/lib/ledger/asked";
import {
  LEAD_SESSION,
  makeClockEvent,
  makeRecord,
  RECEIVED_MS,
  SESSION,
} from "@/tests/make/context";
import { eventId } from "@/tests/make/events";

const batch = { kioskId: "k", proved: [], benchAtMs: null };
const item = { ticket: "26000017", operation: "010" };

describe("askedBy", () => {
  test("asks for the people, sessions, ids and ticket operations of a batch", () => {
    const events = [
      makeClockEvent(1, 20, { kind: "work", activity: "run", items: [item] }),
      makeClockEvent(
        2,
        10,
        { kind: "void", event: eventId(1) },
        { by: "2001", session: LEAD_SESSION },
      ),
    ];
    const asked = askedBy([...events.map((event) => makeRecord(event)), makeRecord(null)], batch);
    expect(asked).toMatchObject({
      numbers: ["1042", "2001"],
      sessions: [SESSION, LEAD_SESSION],
      targets: [eventId(1)],
      items: [item],
      benchAtMs: null,
    });
    expect(asked.ids).toContain(eventId(2));
    expect(asked.ids).toContain(eventId(7000));
    expect(asked.touched).toEqual([
      { number: "1042", atMs: RECEIVED_MS - 20 * 60_000 },
      { number: "1042", atMs: RECEIVED_MS - 10 * 60_000 },
    ]);
  });

  test("touches where a correction takes effect, and now where a bench is wanted", () => {
    const to = "2026-05-13T15:00:00Z";
    const event = makeClockEvent(1, 20, { kind: "move", event: eventId(9), to });
    const asked = askedBy([makeRecord(event)], { ...batch, benchAtMs: RECEIVED_MS });
    expect(asked.touched.map(({ atMs }) => atMs)).toEqual([
      RECEIVED_MS - 20 * 60_000,
      Date.parse(to),
      RECEIVED_MS,
    ]);
  });

  test("names whose credentials came along, also where none of their records can be read", () => {
    const asked = askedBy([makeRecord(null)], { ...batch, proved: [{ worker: "77" }] });
    expect(asked.numbers).toEqual(["77"]);
  });
});
