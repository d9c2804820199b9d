import { describe, expect, test } from "vitest";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import { actOf, namedItems, sharedItems, targetOf, ticketsAbout } from "@/lib/ledger/target";

const id = "01890a5d-ac96-774b-bcce-b302099a8057";
const item = { ticket: "26000017", operation: "010" };
const counts = { good: 1, rework: 0, scrap: 0 };

describe("targetOf", () => {
  test.each<[EventBody, string | null]>([
    [{ kind: "undo", event: id }, id],
    [{ kind: "void", event: id }, id],
    [{ kind: "move", event: id, to: "2026-05-14T07:00:00Z" }, id],
    [{ kind: "reassign", event: id, code: "cleaning" }, id],
    [{ kind: "settle", end: `no-shift-end:${id}`, answer: "leave" }, id],
    [{ kind: "settle", end: "deduction-unattested:2026-05-14", answer: "leave" }, null],
    [{ kind: "object", subject: id }, null],
    [{ kind: "shift-start" }, null],
  ])("%j is about %s", (body, target) => expect(targetOf(body)).toBe(target));
});

describe("actOf", () => {
  test("is the inserted event of an insert, and any other event itself", () => {
    // safe because only the kind and what it holds are asked
    const inner = { id, kind: "shift-end" } as unknown as ClockEvent;
    expect(actOf({ kind: "insert", event: inner } as unknown as ClockEvent)).toBe(inner);
    expect(actOf(inner)).toBe(inner);
  });
});

describe("namedItems and sharedItems", () => {
  test.each<[EventBody, number, number]>([
    [{ kind: "work", activity: "run", items: [item, item] }, 2, 2],
    [{ kind: "reassign", event: id, items: [item] }, 1, 1],
    [{ kind: "reassign", event: id, code: "cleaning" }, 0, 0],
    [{ kind: "pause", items: [item] }, 1, 0],
    [{ kind: "report", ...item, ...counts, stop: false }, 1, 0],
    [{ kind: "inspect", ...item, ...counts }, 1, 0],
    [{ kind: "step-done", ...item, step: "1" }, 1, 0],
    [{ kind: "caution-read", operation: "010", version: "1" }, 0, 0],
  ])("%j names %d and shares time among %d", (body, named, shared) => {
    expect(namedItems(body)).toHaveLength(named);
    expect(sharedItems(body)).toHaveLength(shared);
  });
});

describe("ticketsAbout", () => {
  const work: EventBody = { kind: "work", activity: "run", items: [item] };
  const settle: EventBody = { kind: "settle", end: `past-finish:${id}`, answer: "leave" };
  const other = "01890a5d-ac96-774b-bcce-b302099a8058";

  test("follows an answer, and the void of one, to the tickets of the act", () => {
    const events = new Map<string, EventBody>([
      [id, work],
      [other, settle],
    ]);
    expect(ticketsAbout(id, events)).toEqual(["26000017"]);
    expect(ticketsAbout(other, events)).toEqual(["26000017"]);
  });

  test("ends where nothing is at hand, and where corrections go round in a circle", () => {
    expect(ticketsAbout(null, new Map())).toEqual([]);
    expect(ticketsAbout(id, new Map())).toEqual([]);
    expect(
      ticketsAbout(id, new Map<string, EventBody>([[id, { kind: "void", event: id }]])),
    ).toEqual([]);
  });
});
