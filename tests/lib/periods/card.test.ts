import { describe, expect, test } from "vitest";
import type { DayPart } from "@/lib/agreement/day-text";
import { agreementSubject } from "@/lib/agreement/signatures";
import { cardOf, type WorkerTime } from "@/lib/periods/card";
import { governedWeeks } from "@/lib/policies/governed";
import { boundaryMs } from "@/lib/time/wall-time";
import { zoneClock } from "@/lib/time/zone-clock";
import { makePolicyBook, ZONE } from "@/tests/make/policies";

const clock = zoneClock(ZONE);
const dates = { from: "2026-05-31", to: "2026-06-14" };
const weeks = governedWeeks(makePolicyBook(), "w1", dates, clock);
const rules = {
  dates,
  clock,
  weeksOf: () => weeks,
  digestOf: (text: string) => (text.includes('"indirect"') ? "a" : "b").repeat(64),
  nowMs: boundaryMs("2026-06-15T10:00", ZONE),
  isClosed: false,
};
const worker = { id: "w1", number: "1042", name: "Ilo Varn", cell: "Mill", payrollNumber: null };

function part(start: string, end: string | null, activity: DayPart["activity"]): DayPart {
  const startMs = boundaryMs(start, ZONE);
  const endMs = end === null ? null : boundaryMs(end, ZONE);
  const nothing = { ticket: null, operation: null, code: null };
  return { startMs, endMs, item: 0, activity, seconds: 1, ...nothing };
}

const time = (other: Partial<WorkerTime> = {}): WorkerTime => ({
  worker,
  parts: [part("2026-06-01T06:00", "2026-06-01T14:00", "indirect")],
  confirms: [],
  ends: [],
  ...other,
});
const confirm = (digest: string, by: string | null = "account:lead") => ({
  atMs: 1,
  by,
  subject: agreementSubject("2026-06-01", digest.repeat(64)),
});

describe("cardOf", () => {
  test("has the days with time, each as it is paid", () => {
    const { days, state } = cardOf(time(), rules);
    expect(days.map(({ date, stated }) => [date, stated[0]!.paidSeconds / 3600])).toEqual([
      ["2026-06-01", 8],
    ]);
    expect(state).toBe("to look at");
  });
  test("is agreed when the lead agreed to every day as it is", () => {
    const agreed = cardOf(time({ confirms: [confirm("a")] }), rules);
    expect(agreed).toMatchObject({ state: "agreed", signedByLead: true, signedByWorker: false });
    const changed = cardOf(time({ confirms: [confirm("c")] }), rules);
    expect(changed).toMatchObject({ state: "to look at", signedByLead: false });
    const both = [confirm("a"), confirm("a", null)];
    expect(cardOf(time({ confirms: both }), rules).signedByWorker).toBe(true);
  });
  test("counts what is open in the period's own workdays", () => {
    const at = (text: string) => ({ code: "no-shift-end", atMs: boundaryMs(text, ZONE) });
    const ends = [at("2026-05-30T23:59"), at("2026-05-31T00:00"), at("2026-06-14T00:00")];
    expect(cardOf(time({ ends, confirms: [confirm("a")] }), rules)).toMatchObject({
      ends: [ends[1]],
      state: "to look at",
    });
  });
  test("time that runs cannot be agreed to, and is counted up to now", () => {
    const parts = [part("2026-06-13T20:00", null, "indirect")];
    const { days, state } = cardOf(time({ parts }), rules);
    expect(days).toMatchObject([{ agreement: null, stated: [{ paidSeconds: 4 * 3600 }] }]);
    expect(state).toBe("to look at");
  });
  test("time outside the period is not on the card, though it decides its overtime", () => {
    const week = ["08", "09", "10", "11", "12"].map((day) =>
      part(`2026-06-${day}T06:00`, `2026-06-${day}T16:00`, "run"),
    );
    const dates = { from: "2026-06-12", to: "2026-06-14" };
    const { days } = cardOf(time({ parts: week }), { ...rules, dates });
    expect(days.map(({ date, stated }) => [date, stated[0]!.buckets.overtime / 3600])).toEqual([
      ["2026-06-12", 10],
    ]);
  });
  test("without any time it is empty, and nothing is left to agree to", () => {
    expect(cardOf(time({ parts: [] }), rules)).toMatchObject({ days: [], state: "agreed" });
  });
});
