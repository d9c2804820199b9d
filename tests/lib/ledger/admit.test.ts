import { describe, expect, test } from "vitest";
import { type Known, keptFor } from "@/lib/ledger/admit";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import { makeClockEvent, makeContext, makeRecord } from "@/tests/make/context";
import { eventId } from "@/tests/make/events";

const { workers, sessions } = makeContext();
const [worker, lead] = workers;
const [ours, theirs] = sessions;
const known: Known = {
  isRevoked: false,
  kioskCells: ["mill"],
  worker,
  by: undefined,
  session: ours,
};

function decided(event: ClockEvent, other: Partial<Known> = {}) {
  return keptFor(event, makeRecord(event).readable!.placed, { ...known, ...other });
}

describe("keptFor", () => {
  const start = makeClockEvent(1, 5, { kind: "shift-start" });

  test("books what a known worker's own session proves", () => {
    expect(decided(start)).toBeNull();
  });

  test.each<[string, Partial<Known>, string]>([
    ["from a kiosk out of use, whatever else", { isRevoked: true, worker: undefined }, "revoked"],
    [
      "of nobody known, before its proof is asked",
      { worker: undefined, session: undefined },
      "unknown-worker",
    ],
    ["without a session on this kiosk", { session: undefined }, "unproved"],
    ["with somebody else's session", { session: theirs }, "unproved"],
  ])("keeps a record %s", (_, other, code) => expect(decided(start, other)).toBe(code));

  test("keeps what lies in the future, once it is proved", () => {
    const future = makeClockEvent(2, -30, { kind: "shift-start" });
    expect(decided(future)).toBe("future");
    expect(decided(future, { session: undefined })).toBe("unproved");
  });

  describe("of what a lead enters for others", () => {
    const by = { by: "2001", session: theirs!.id };
    const isLeads = { by: lead, session: theirs };
    const bodies: EventBody[] = [
      { kind: "void", event: eventId(1) },
      { kind: "move", event: eventId(1), to: start.at },
      { kind: "insert", event: start },
      { kind: "settle", end: "no-shift-end:1", answer: "leave" },
      { kind: "release", hold: "cure" },
    ];

    test.each(bodies)("$kind asks for a lead's session", (body) => {
      expect(decided(makeClockEvent(3, 5, body))).toBe("unproved");
      expect(decided(makeClockEvent(3, 5, body, by), isLeads)).toBeNull();
    });

    test("an ordinary act for somebody else too", () => {
      const event = makeClockEvent(3, 5, { kind: "shift-end" }, by);
      expect(decided(event, isLeads)).toBeNull();
      expect(decided(event, { by: worker, session: ours })).toBe("unproved");
      expect(decided(event, { by: undefined, session: theirs })).toBe("unproved");
      expect(decided(event, { by: lead, session: ours })).toBe("unproved");
    });

    test("reaches the people of the own cells, and whoever works in one of them", () => {
      const event = makeClockEvent(3, 5, { kind: "shift-end" }, by);
      const neck = { ...lead!, held: [{ role: "lead" as const, cells: ["neck"] }] };
      expect(decided(event, { ...isLeads, by: neck })).toBe("unproved");
      expect(decided(event, { ...isLeads, by: neck, kioskCells: ["spray", "neck"] })).toBeNull();
      const admin = { ...lead!, held: [{ role: "admin" as const, cells: [] }] };
      expect(decided(event, { ...isLeads, by: admin })).toBe("unproved");
    });
  });
});
