import { describe, expect, test } from "vitest";
import { settlingActs } from "@/lib/ends/settle";
import { type EndFacts, waysFor } from "@/lib/ends/ways";
import { keptCodes, questionCodes } from "@/lib/ledger/schema";
import { fold } from "@/lib/timeline/fold";
import { eventId, foldFacts, makeEvent } from "@/tests/make/events";

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
const acts = (facts: EndFacts, answer: string, toldMs: number | null = null) => {
  const settled = settlingActs(facts, { answer, toldMs });
  return settled.ok ? settled.value : settled.problem.detail;
};

describe("settlingActs", () => {
  test("ends a forgotten shift where its proposal says", () => {
    expect(acts(end(), "end-at:2026-05-06T14:30:00.000Z")).toEqual([
      {
        kind: "settle",
        end: `no-shift-end:${eventId(1)}`,
        answer: "end-at:2026-05-06T14:30:00.000Z",
      },
    ]);
  });

  test("the last tap's own second ends the shift after the tap, without a second more", () => {
    const start = makeEvent(1, at("06:00:00"), { kind: "shift-start" });
    const last = makeEvent(2, at("12:12:03") + 500, { kind: "indirect", code: "cleaning" });
    const [way] = waysFor(end());
    const [settle] = acts(end(), way!.answer) as Exclude<ReturnType<typeof acts>, string>;
    const answer = makeEvent(3, at("20:00:00"), settle!, { kiosk: null, by: "account:a" });
    const folded = fold([start, last, answer], foldFacts, at("20:00:00"));
    expect(folded.shifts).toMatchObject([{ end: at("12:12:03") / 1000, provisional: false }]);
    expect(folded.looseEnds).toMatchObject([{ code: "no-shift-end", settled: true }]);
  });

  test("a told time is the answer", () => {
    expect(acts(end(), "end-at", at("13:00:00"))).toMatchObject([
      { answer: "end-at:2026-05-06T13:00:00.000Z" },
    ]);
  });

  test("a correction goes before the answer that means it", () => {
    const late = end({ code: "implied-start", atMs: at("06:20:00"), shift: null });
    expect(acts(late, "enter:shift-start:2026-05-06T06:00:00.000Z")).toEqual([
      {
        kind: "insert",
        event: { kind: "shift-start", at: "2026-05-06T06:00:00.000Z" },
      },
      { kind: "settle", end: `implied-start:${eventId(1)}`, answer: "enter:shift-start" },
    ]);
    expect(acts(end({ code: "two-kiosks" }), "void")).toMatchObject([
      { kind: "void", event: eventId(1) },
      { kind: "settle", answer: "void" },
    ]);
  });

  test("a judge's question is about the record at the end of its subject", () => {
    const about = end({ code: "over-count", subject: `26000017/010:${eventId(7)}` });
    expect(acts(about, "void")).toMatchObject([
      { kind: "void", event: eventId(7) },
      { end: `over-count:26000017/010:${eventId(7)}` },
    ]);
  });

  test("takes in a record that was kept, as it was and when it was", () => {
    const body = { kind: "indirect", code: "cleaning" } as const;
    const kept = end({ code: "unproved", body, atMs: at("09:00:00") });
    expect(acts(kept, "take-in")).toMatchObject([
      { kind: "insert", event: { ...body, at: "2026-05-06T09:00:00.000Z" } },
      { kind: "settle", answer: "take-in" },
    ]);
    expect(acts(kept, "leave-out")).toMatchObject([{ kind: "settle", answer: "leave-out" }]);
  });

  test("ends the break that was begun, of its kind", () => {
    const open = end({ code: "break-open", body: { kind: "break-start", break: "meal" } });
    expect(acts(open, "enter:break-end", at("10:30:00"))).toMatchObject([
      { kind: "insert", event: { kind: "break-end", break: "meal" } },
      { kind: "settle" },
    ]);
  });

  test("takes back what an undo came too late for", () => {
    const late = end({ code: "undo-late", body: { kind: "undo", event: eventId(5) } });
    expect(acts(late, "void-undone")).toMatchObject([{ kind: "void", event: eventId(5) }, {}]);
  });

  test("for every code, every way that asks nothing gives a settle at its end", () => {
    for (const code of [...keptCodes, ...questionCodes]) {
      for (const way of waysFor(end({ code })).filter(({ asks }) => asks !== "time")) {
        const given = acts(end({ code }), way.answer);
        expect(given, `${code} ${way.answer}`).toBeInstanceOf(Array);
        expect(given.at(-1), `${code} ${way.answer}`).toMatchObject({ kind: "settle" });
      }
    }
  });

  describe("refuses in words", () => {
    test.each([
      ["end-at", at("20:00:01"), /still to come/],
      ["end-at", at("12:12:02"), /a tap after that/],
      ["end-at", null, /Give the time/],
      ["accept", null, /no longer how/],
    ] as const)("%s told %s", (answer, toldMs, why) => {
      expect(acts(end(), answer, toldMs)).toMatch(why);
    });
    test("a start after the first tap, or days before", () => {
      const late = end({ code: "implied-start", atMs: at("06:20:00"), shift: null });
      expect(acts(late, "enter:shift-start", at("06:20:01"))).toMatch(/after the first tap/);
      expect(acts(late, "enter:shift-start", at("06:20:00") - 37 * 3_600_000)).toMatch(/36 hours/);
    });
    test("a time before the shift", () => {
      const long = end({ code: "shift-long" });
      expect(acts(long, "enter:shift-end", at("05:59:59"))).toMatch(/before the shift/);
    });
  });
});
