import { describe, expect, test } from "vitest";
import type { Card } from "@/lib/periods/card";
import {
  type CardLine,
  dayStretches,
  lineOfCard,
  lineOfFrozen,
  linesAgreed,
  reconcile,
  statedOf,
} from "@/lib/periods/cards-view";
import { makeDay, makeFrozenCard } from "@/tests/make/frozen";

const worker = { id: "w1", number: "1042", name: "Ilo Varn", cell: "Mill", payrollNumber: null };
const agreement = { worker: null, lead: null, hasLapsed: false };
const signed = { worker: null, lead: { atMs: 1, by: "Ada" }, hasLapsed: false };

function makeCard(
  other: Partial<Card> & { agreement?: Card["days"][number]["agreement"] } = {},
): Card {
  const { agreement: own = signed, ...rest } = other;
  const stated = { ...makeDay("2026-06-01", 36_000, { workedSeconds: 36_060 }), trail: [] };
  return {
    worker,
    days: [{ date: "2026-06-01", startMs: 0, endMs: 86_400_000, agreement: own, stated: [stated] }],
    warnings: [],
    ends: [],
    state: "agreed",
    signedByWorker: false,
    signedByLead: true,
    ...rest,
  };
}

const look = { state: "to look at", signedByLead: false } as const;

describe("lineOfCard", () => {
  test("shows what was tapped beside what is paid", () => {
    expect(lineOfCard(makeCard(), 28_800)).toMatchObject({
      plannedSeconds: 28_800,
      tappedSeconds: 36_060,
      hours: { worked: "10.02", paid: "10.00" },
      toLookAt: "",
    });
  });
  test.each([
    [{ ends: [{ code: "no-shift-end", atMs: 1 }] }, "1 to settle"],
    [{ agreement: null }, "still at work"],
    [{ agreement: { ...agreement, hasLapsed: true } }, "changed since it was agreed to"],
    [{ agreement }, "waits for the lead"],
  ])("says why it is to look at: %j is %s", (change, words) => {
    expect(lineOfCard(makeCard({ ...look, ...change }), null).toLookAt).toBe(words);
  });
  test("an agreed card still shows its first warning", () => {
    const warnings = [{ code: "shift-length", date: "2026-06-01", text: "Long." }];
    expect(lineOfCard(makeCard({ warnings }), null).toLookAt).toBe("Long.");
  });
});

describe("lineOfFrozen", () => {
  test("sums the days and what it adjusts, and says why it was closed with a question", () => {
    const card = makeFrozenCard({ reason: "bank day" });
    const change = makeDay("2026-05-20", -3600);
    const line = lineOfFrozen(card, [makeDay("2026-06-01", 36_000)], {
      plannedSeconds: null,
      changes: [change],
    });
    expect(line).toMatchObject({ state: "closed", tappedSeconds: 32_400, hours: { paid: "9.00" } });
    expect(line.toLookAt).toBe("closed with a question: bank day");
  });
});

describe("reconcile", () => {
  const agreed = lineOfCard(makeCard(), null);
  const open: CardLine = lineOfCard(makeCard(look), null);
  test("sets what was agreed to against the file, line by line", () => {
    const { people, lines } = reconcile(linesAgreed([agreed, open]), [agreed, open]);
    expect(people).toEqual([1, 2]);
    expect(lines.at(-1)).toEqual({
      name: "hours in all",
      book: "10.00",
      day: "20.00",
      isMatched: false,
    });
    expect(lines.find(({ name }) => name === "overtime")!.isMatched).toBe(true);
  });
  test("is matched throughout when all are agreed to", () => {
    expect(reconcile([agreed], [agreed]).lines.every(({ isMatched }) => isMatched)).toBe(true);
  });
  test("of nothing is nothing", () => {
    expect(reconcile([], []).lines.at(-1)).toMatchObject({ book: "0.00", day: "0.00" });
  });
});

describe("dayStretches", () => {
  const nothing = { ticket: null, operation: null, code: null, seconds: null };
  const part = (startMs: number, endMs: number | null, activity: "run" | "meal", item = 0) => ({
    ...nothing,
    startMs,
    endMs,
    activity,
    item,
  });
  test("cuts each stretch to the day, draws it once, and what runs up to now", () => {
    const parts = [
      part(-5000, 5000, "run"),
      part(-5000, 5000, "run", 1),
      part(5000, 7000, "meal"),
      part(7000, null, "run"),
      part(20_000, 30_000, "run"),
    ];
    expect(dayStretches(parts, { startMs: 0, endMs: 10_000 }, 9000)).toEqual([
      { start: 0, end: 5, kind: "work" },
      { start: 5, end: 7, kind: "meal" },
      { start: 7, end: 9, kind: "work" },
    ]);
  });
});

describe("statedOf", () => {
  test("lists every stated day of a card", () => {
    expect(statedOf(makeCard()).map(({ date }) => date)).toEqual(["2026-06-01"]);
  });
});
