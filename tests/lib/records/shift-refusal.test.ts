import { describe, expect, test } from "vitest";
import { shiftRefusal } from "@/lib/records/shift-refusal";
import { clockText } from "@/lib/time/format";
import { eventId, makeEvent } from "@/tests/make/events";

const at = (time: string) => Date.parse(`2026-05-06T${time}:00Z`);
const clock = (ms: number) => clockText(ms, "UTC");
const shift = (start: string, end: string | null, provisional = false) => ({
  startMs: at(start),
  endMs: end === null ? null : at(end),
  startEventId: eventId(1),
  endEventId: null,
  provisional,
  cellId: null,
});
const start = makeEvent(1, at("06:00"), { kind: "shift-start" });
const tapped = makeEvent(2, at("09:00"), { kind: "indirect", code: "cleaning" });
const events = [start, tapped];

describe("shiftRefusal", () => {
  const enter = (
    deed: "shift-start" | "shift-end",
    time: string,
    shifts = [shift("06:00", null)],
  ) => shiftRefusal({ shifts, events }, { deed, atMs: at(time) }, clock);

  test("an open shift takes an end after its last tap", () => {
    expect(enter("shift-end", "09:00")).toBeNull();
    expect(enter("shift-end", "14:30")).toBeNull();
  });
  test("a forgotten one too, also later than its provisional end", () => {
    expect(enter("shift-end", "15:00", [shift("06:00", "14:30", true)])).toBeNull();
  });
  test("somebody who is out can be let in", () => {
    expect(enter("shift-start", "05:00")).toBeNull();
    expect(enter("shift-start", "14:00", [shift("06:00", "14:00")])).toBeNull();
  });
  test.each([
    ["shift-start", "10:00", [shift("06:00", null)], /In since 06:00 already/],
    ["shift-start", "10:00", [shift("06:00", "14:00")], /In since 06:00 already/],
    ["shift-end", "10:00", [shift("06:00", "14:00")], /ended at 14:00/],
    ["shift-end", "08:59", [shift("06:00", null)], /a tap at 09:00/],
    ["shift-end", "05:00", [shift("06:00", null)], /No shift runs/],
    ["shift-end", "15:00", [shift("06:00", "14:00")], /No shift runs/],
  ] as const)("refuses %s at %s of %j", (deed, time, shifts, why) => {
    expect(enter(deed, time, [...shifts])).toMatch(why);
  });
});
