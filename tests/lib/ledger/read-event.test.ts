import { describe, expect, test } from "vitest";
import { readEvent } from "@/lib/ledger/read-event";

const id = "01890a5d-ac96-774b-bcce-b302099a8057";
const event = {
  id,
  v: 1,
  kind: "shift-start",
  session: id,
  worker: "1042",
  at: "2026-05-14T08:00:00Z",
  clock: { offsetMs: 0, uncertaintyMs: 0, boot: "b", monotonicMs: 1, seq: 1 },
};
const inserted = { ...event, kind: "report", ticket: "26000017", operation: "010" };
const deep = () => JSON.parse(`${'{"kind":'.repeat(100_000)}"x"${"}".repeat(100_000)}`);
const counts = { good: 1, rework: 0, scrap: 0, stop: true };

describe("readEvent", () => {
  test("reads an event and forgives spaces and hyphens in a ticket's number", () => {
    expect(readEvent(event)).toEqual(event);
    const item = { ticket: "26-00001-7", operation: "010" };
    const work = readEvent({ ...event, kind: "work", activity: "run", items: [item] });
    expect(work).toMatchObject({ items: [{ ticket: "26000017" }] });
  });

  test("mends a note that could not be stored, rather than lose the act", () => {
    const read = readEvent({ ...event, note: "wrong\0 bin \ud83d" });
    expect(read?.note).toBe("wrong bin \ufffd");
    expect(readEvent({ ...event, note: "right bin \ud83d\ude00" })?.note).toContain("\ud83d\ude00");
  });

  test("gives an inserted event's note to the whole, where it can be erased", () => {
    const insert = {
      ...event,
      kind: "insert",
      by: "7",
      event: { ...inserted, ...counts, note: "n" },
    };
    const read = readEvent(insert);
    expect(read?.note).toBe("n");
    expect(JSON.stringify(read)).not.toContain('"note":"n","');
    expect(read).toMatchObject({ event: { good: 1 } });
    expect(readEvent({ ...insert, note: "of the lead" })?.note).toBe("n");
  });

  test.each([
    ["nothing at all", null],
    ["a word", "shift-start"],
    ["a list", [event]],
    ["an unknown kind", { ...event, kind: "nap" }],
    ["an unknown field", { ...event, mood: "good" }],
    ["a missing field", { ...event, clock: undefined }],
    ["a version that is not known here", { ...event, v: 2 }],
    ["a number where text belongs", { ...event, worker: 1042 }],
    ["a date without offset", { ...event, at: "2026-05-14T08:00:00" }],
    ["an instant before 2000", { ...event, at: "1999-12-31T23:59:59Z" }],
    ["a year that no calendar has", { ...event, at: "0000-01-01T00:00:00Z" }],
    ["a NUL in a code", { ...event, kind: "indirect", code: "clean\0ing" }],
    ["half a character in a code", { ...event, kind: "indirect", code: "clean\ud83d" }],
    ["a move before 2000", { ...event, kind: "move", event: id, to: "0001-01-01T00:00:00Z" }],
    ["an insert of half an event", { ...event, kind: "insert", event: { kind: "shift-end" } }],
    ["an insert for somebody else", { ...event, kind: "insert", event: { ...event, worker: "1" } }],
    [
      "an insert of an insert",
      { ...event, kind: "insert", event: { ...event, kind: "insert", event } },
    ],
    ["an insert that no stack is deep enough for", { ...event, kind: "insert", event: deep() }],
    [
      "an insert before 2000",
      { ...event, kind: "insert", event: { ...event, at: "1970-01-01T00:00:00Z" } },
    ],
  ])("is null for %s", (_, raw) => expect(readEvent(raw)).toBeNull());
});
