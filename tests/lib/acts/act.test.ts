import { describe, expect, test } from "vitest";
import {
  insertedAct,
  isPresence,
  isSameItem,
  itemRef,
  startsShift,
  takenOut,
} from "@/lib/acts/act";
import type { EventBody } from "@/lib/ledger/schema";
import { eventId, makeEvent } from "@/tests/make/events";

const item = { ticket: "26048176", operation: "120" };
const count = { ...item, good: 1, rework: 0, scrap: 0 };
const bodies: Record<string, EventBody> = {
  work: { kind: "work", activity: "run", items: [item] },
  report: { kind: "report", ...count, stop: true },
  reading: { kind: "reading", ...item, name: "humidity", value: 45 },
  object: { kind: "object", subject: "count" },
  start: { kind: "shift-start" },
};
const event = (name: string, by: string | null) => makeEvent(1, 0, bodies[name]!, { by });

describe("startsShift and isPresence", () => {
  test.each([
    { name: "work", by: null, starts: true, shows: true },
    { name: "work", by: "7", starts: true, shows: true },
    { name: "report", by: null, starts: true, shows: true },
    { name: "report", by: "7", starts: false, shows: false },
    { name: "reading", by: null, starts: false, shows: true },
    { name: "reading", by: "7", starts: false, shows: false },
    { name: "object", by: null, starts: false, shows: false },
    { name: "start", by: "7", starts: false, shows: true },
  ])("$name entered by $by: starts $starts, shows $shows", ({ name, by, starts, shows }) => {
    expect(startsShift(event(name, by))).toBe(starts);
    expect(isPresence(event(name, by))).toBe(shows);
  });
});

describe("takenOut", () => {
  test.each<[string, EventBody, number]>([
    ["a count that stops", { kind: "report", ...count, stop: true }, 1],
    ["a count that lets the work run on", { kind: "report", ...count, stop: false }, 0],
    ["a pause of two", { kind: "pause", items: [item, { ...item, operation: "130" }] }, 2],
    ["a hand-over", { kind: "hand-over", ...item, to: "1043" }, 1],
    ["an inspection", { kind: "inspect", ...count }, 0],
    ["work", { kind: "work", activity: "run", items: [item] }, 0],
  ])("%s takes out what it should", (_, body, number) => {
    expect(takenOut(body)).toHaveLength(number);
  });
});

describe("isSameItem", () => {
  test("needs ticket and operation, and nothing else", () => {
    expect(isSameItem(item, itemRef({ ...item, ...{ weight: 5 } }))).toBe(true);
    expect(isSameItem(item, { ...item, operation: "130" })).toBe(false);
    expect(isSameItem(item, { ...item, ticket: "26048184" })).toBe(false);
  });
});

describe("insertedAct", () => {
  const at = "2026-06-08T09:00:00Z";
  const insert = (event: Record<string, unknown> & { kind: string }): EventBody => ({
    kind: "insert",
    event,
  });
  test("reads a whole event and leaves out what travels with every one", () => {
    const whole = { id: eventId(5), v: 1, worker: "1042", at, ...bodies.work! };
    expect(insertedAct(insert(whole))).toEqual({ atMs: Date.parse(at), body: bodies.work });
  });
  test("forgives the spelling of a ticket as every event does", () => {
    const spelled = { kind: "hand-over", ticket: "26-04817-6", operation: "120", to: "7", at };
    expect(insertedAct(insert(spelled))?.body).toMatchObject({ ticket: "26048176" });
  });
  test.each([
    ["without an instant", { ...bodies.start! }],
    ["with an instant that is none", { ...bodies.start!, at: "this morning" }],
    ["of an unknown kind", { kind: "nap", at }],
    ["with a body that cannot be read", { kind: "work", activity: "run", items: [], at }],
    ["that is a correction itself", { kind: "void", event: eventId(1), at }],
  ])("takes none %s", (_, inner) => expect(insertedAct(insert(inner))).toBeNull());
  test("takes no other kind", () => {
    expect(insertedAct(bodies.start!)).toBeNull();
  });
});
