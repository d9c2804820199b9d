import { describe, expect, test } from "vitest";
import { deriveWindow, isInWindow, ticketsTouched, timeTouched } from "@/lib/timeline/derive";
import { makeWindow } from "@/tests/make/context";
import { eventId, makeEvent, siteRules } from "@/tests/make/events";

const HOUR = 3_600_000;
const DAY = Date.UTC(2026, 4, 14);
const rules = [siteRules];
const items = [{ ticket: "26000017", operation: "010" }];
const start = makeEvent(1, DAY + 6 * HOUR, { kind: "shift-start" });
const work = makeEvent(2, DAY + 7 * HOUR, { kind: "work", activity: "run", items });
const end = makeEvent(3, DAY + 9 * HOUR, { kind: "shift-end" });
const window = makeWindow({ firstMs: DAY + 6 * HOUR, lastMs: DAY + 9 * HOUR });

describe("deriveWindow", () => {
  test("says what the events and the added ones change", () => {
    const derived = deriveWindow({ ...window, events: [start, work] }, [end], { rules, asOfMs: 0 });
    expect(derived.segments.changed.map(({ activity, seconds }) => [activity, seconds])).toEqual([
      ["unassigned", 3600],
      ["run", 7200],
    ]);
    expect(ticketsTouched(derived, [])).toEqual(["26000017"]);
  });

  test("changes nothing where everything is kept already", () => {
    const before = deriveWindow(window, [start, work, end], { rules, asOfMs: 0 });
    const kept = {
      ...window,
      events: [start, work, end],
      segments: before.segments.changed,
      shifts: before.shifts.changed,
      reports: before.reports.changed,
      looseEnds: before.looseEnds.changed,
    };
    const again = deriveWindow(kept, [], { rules, asOfMs: 0 });
    for (const change of [again.segments, again.shifts, again.reports, again.looseEnds]) {
      expect(change).toEqual({ gone: [], changed: [] });
    }
    expect(ticketsTouched(again, kept.segments)).toEqual([]);
  });

  test("names what is gone", () => {
    const before = deriveWindow(window, [start, work, end], { rules, asOfMs: 0 });
    const kept = { ...window, segments: before.segments.changed, events: [start, end] };
    const derived = deriveWindow(kept, [], { rules, asOfMs: 0 });
    expect(derived.segments.gone).toMatchObject([{ activity: "run" }]);
    expect(ticketsTouched(derived, kept.segments)).toEqual(["26000017"]);
  });

  test("names also the ticket whose time became another's", () => {
    const before = deriveWindow(window, [start, work, end], { rules, asOfMs: 0 });
    const [first, run] = before.segments.changed;
    const other = { ...run!, ticket: "26000028", cellId: "elsewhere" };
    const kept = { ...window, segments: [first!, other], events: [start, work, end] };
    const derived = deriveWindow(kept, [], { rules, asOfMs: 0 });
    expect(ticketsTouched(derived, kept.segments)).toEqual(["26000028", "26000017"]);
    const stretch = { startMs: DAY + 7 * HOUR, endMs: DAY + 9 * HOUR };
    expect(timeTouched(derived, kept.segments)).toEqual([
      { ...stretch, cell: "elsewhere" },
      { ...stretch, cell: run!.cellId },
    ]);
  });

  test("time that runs is in no sum yet", () => {
    const running = deriveWindow(window, [start, work], { rules, asOfMs: 0 });
    expect(timeTouched(running, [])).toEqual([
      { startMs: DAY + 6 * HOUR, endMs: DAY + 7 * HOUR, cell: running.segments.changed[0]!.cellId },
    ]);
  });

  test("is never as of a moment before the recorded one", () => {
    const overdue = { ...window, events: [start], asOfMs: DAY + 30 * HOUR };
    const derived = deriveWindow(overdue, [], { rules, asOfMs: DAY + 7 * HOUR });
    expect(derived.asOfMs).toBe(DAY + 30 * HOUR);
    expect(
      deriveWindow({ ...window, events: [start] }, [], { rules, asOfMs: DAY + 7 * HOUR }),
    ).toMatchObject({ folded: { standing: { event: eventId(1) } } });
    expect(derived.folded.standing).toBeNull();
  });

  test("leaves out what the fold says of other days: it saw only a part of them", () => {
    const elsewhere = makeEvent(4, DAY - 40 * HOUR, { kind: "indirect", code: "cleaning" });
    const derived = deriveWindow({ ...window, events: [elsewhere, start] }, [], {
      rules,
      asOfMs: DAY + 7 * HOUR,
    });
    expect(derived.shifts.changed.map(({ startMs }) => startMs)).toEqual([DAY + 6 * HOUR]);
    expect(derived.looseEnds.changed).toEqual([]);
  });

  test("lets the plan of the day end a shift that nobody ended", () => {
    const planned = [{ startMs: DAY + 6 * HOUR, endMs: DAY + 14 * HOUR }];
    const derived = deriveWindow({ ...window, events: [start], planned }, [], {
      rules,
      asOfMs: DAY + 30 * HOUR,
    });
    expect(derived.shifts.changed).toMatchObject([{ endMs: DAY + 14 * HOUR, provisional: true }]);
  });
});

describe("isInWindow", () => {
  test("takes both ends in, and the second to which its first instant is floored", () => {
    const bounds = { firstMs: 10_500, lastMs: 20_500 };
    expect([9_999, 10_000, 20_500, 20_501].map((at) => isInWindow(bounds, at))).toEqual([
      false,
      true,
      true,
      false,
    ]);
  });
});
