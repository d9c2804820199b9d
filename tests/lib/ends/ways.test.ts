import { describe, expect, test } from "vitest";
import { type EndFacts, enteredKind, insertOf, isKept, waysFor } from "@/lib/ends/ways";
import { keptCodes, questionCodes } from "@/lib/ledger/schema";
import { eventId } from "@/tests/make/events";

const at = (time: string) => Date.parse(`2026-05-06T${time}Z`);

function end(other: Partial<EndFacts> = {}): EndFacts {
  return {
    code: "no-shift-end",
    subject: eventId(1),
    atMs: at("12:12:03"),
    receivedMs: at("06:00:00"),
    body: { kind: "shift-start" },
    shift: { startMs: at("06:00:00"), endMs: at("14:30:00") },
    planned: { startMs: at("06:00:00"), endMs: at("14:30:00") },
    timeZone: "UTC",
    nowMs: at("20:00:00"),
    ...other,
  };
}
const answers = (facts: EndFacts) => waysFor(facts).map(({ answer }) => answer);

describe("waysFor", () => {
  test("a forgotten end: the last tap, the planned end, another time", () => {
    expect(waysFor(end())).toEqual([
      { answer: "end-at:2026-05-06T12:12:03.999Z", label: "End at 12:12" },
      { answer: "end-at:2026-05-06T14:30:00.000Z", label: "End at 14:30" },
      { answer: "end-at", label: "End then", asks: "time" },
    ]);
  });

  test("a planned end before the last tap, to come, or none at all is not proposed", () => {
    const two = ["end-at:2026-05-06T12:12:03.999Z", "end-at"];
    expect(answers(end({ planned: { startMs: 0, endMs: at("12:12:03") } }))).toEqual(two);
    expect(answers(end({ nowMs: at("14:00:00") }))).toEqual(two);
    expect(answers(end({ planned: null }))).toEqual(two);
  });

  test("a missing start is proposed where the plan is earlier", () => {
    const late = end({ code: "implied-start", atMs: at("06:20:00") });
    expect(answers(late)).toEqual([
      "enter:shift-start:2026-05-06T06:00:00.000Z",
      "enter:shift-start",
      "accept",
    ]);
    expect(answers({ ...late, planned: null })).toEqual(["enter:shift-start", "accept"]);
  });

  test("a kept record is taken in or left out; what cannot be read, only left out", () => {
    const kept = end({ code: "unproved", body: { kind: "indirect", code: "cleaning" } });
    expect(answers(kept)).toEqual(["take-in", "leave-out"]);
    expect(answers({ ...kept, code: "unreadable", body: null })).toEqual(["leave-out"]);
    expect(answers({ ...kept, body: { kind: "void", event: eventId(2) } })).toEqual(["leave-out"]);
  });

  test("an unknown number asks whose it is, a record from the future when it was", () => {
    const kept = end({ body: { kind: "shift-start" } });
    expect(waysFor({ ...kept, code: "unknown-worker" })[0]?.asks).toBe("worker");
    expect(waysFor({ ...kept, code: "future" })[0]?.asks).toBe("time");
  });

  test("every code has at least one way, and no two ways of one say the same", () => {
    for (const code of [...keptCodes, ...questionCodes]) {
      const ways = waysFor(end({ code }));
      expect(ways.length, code).toBeGreaterThan(0);
      expect(new Set(ways.map(({ label }) => label)).size, code).toBe(ways.length);
      expect(new Set(ways.map(({ answer }) => answer)).size, code).toBe(ways.length);
    }
  });
});

describe("isKept", () => {
  test("tells records that do not count from questions", () => {
    expect(keptCodes.every(isKept)).toBe(true);
    expect(questionCodes.some(isKept)).toBe(false);
  });
});

describe("insertOf", () => {
  test("wraps an act with its instant", () => {
    expect(insertOf({ kind: "break-end", break: "meal" }, at("12:00:00"))).toEqual({
      kind: "insert",
      event: { kind: "break-end", at: "2026-05-06T12:00:00.000Z", break: "meal" },
    });
  });
});

describe("enteredKind", () => {
  test("reads what an answer enters", () => {
    expect(enteredKind("enter:shift-end")).toBe("shift-end");
    expect(enteredKind("enter:report")).toBeNull();
    expect(enteredKind("accept")).toBeNull();
  });
});
