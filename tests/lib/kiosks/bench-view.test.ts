import { describe, expect, test } from "vitest";
import { benchOf } from "@/lib/kiosks/bench-view";
import { bench } from "@/lib/kiosks/schema";
import type { Window } from "@/lib/ledger/context";
import { deriveWindow } from "@/lib/timeline/derive";
import type { LedgerEvent } from "@/lib/timeline/schema";
import { makeContext, makeWindow, RECEIVED_MS } from "@/tests/make/context";
import { makeEvent } from "@/tests/make/events";

const ago = (minutes: number) => RECEIVED_MS - minutes * 60_000;
const item = { ticket: "26000017", operation: "010" };

function shown(events: LedgerEvent[], other: Partial<Window> = {}, next = makeContext().next) {
  const context = makeContext({ next });
  const window = makeWindow({ firstMs: ago(240), events, ...other });
  const { folded } = deriveWindow(window, [], { rules: context.rules, asOfMs: RECEIVED_MS });
  return bench.parse(benchOf({ window, folded, context, atMs: RECEIVED_MS }));
}

const start = makeEvent(1, ago(240), { kind: "shift-start" });
const work = makeEvent(2, ago(200), { kind: "work", activity: "setup", items: [item] });

describe("benchOf", () => {
  test("of somebody who is out shows nothing but the day", () => {
    expect(shown([])).toMatchObject({
      shift: null,
      work: null,
      other: null,
      break: null,
      breakSince: null,
      events: [],
      planned: null,
      today: { attendanceSeconds: 0 },
    });
  });

  test("shows the work since its last tap", () => {
    expect(shown([start, work])).toMatchObject({
      shift: { start: new Date(ago(240)).toISOString() },
      work: {
        activity: "setup",
        since: new Date(ago(200)).toISOString(),
        said: false,
        items: [{ ...item, weight: 1 }],
      },
      other: null,
    });
  });

  test("shows a break, and what it interrupts", () => {
    const rest = makeEvent(3, ago(10), { kind: "break-start", break: "rest" });
    const shownInBreak = shown([start, work, rest]);
    expect(shownInBreak).toMatchObject({ break: "rest", work: { items: [item] } });
    expect(shownInBreak.breakSince).toBe(new Date(ago(10)).toISOString());
    expect(shownInBreak.work?.items[0]?.bookedSeconds).toBe(0);
  });

  test("tells what others altered since the sign-in before, and no agreement", () => {
    const by = { by: "account:a" };
    const move = makeEvent(
      3,
      ago(10),
      { kind: "move", event: work.id, to: "2026-05-14T04:00:00Z" },
      by,
    );
    const agreed = makeEvent(4, ago(9), { kind: "confirm", subject: "workday:x" }, by);
    const changes = shown([start, work, move, agreed], { seenMs: ago(100) }).changes;
    expect(changes).toMatchObject([{ kind: "move", by: "account:a" }]);
    expect(shown([start, work, move], { seenMs: ago(1) }).changes).toEqual([]);
  });

  test("shows other work", () => {
    const other = makeEvent(3, ago(10), { kind: "indirect", code: "cleaning" });
    expect(shown([start, other])).toMatchObject({
      work: null,
      other: { code: "cleaning", since: new Date(ago(10)).toISOString() },
    });
  });

  test("sums today until now, with what lies before the window but on the same day", () => {
    const earlier = {
      startMs: ago(7 * 60),
      item: 0,
      endMs: ago(6 * 60),
      activity: "run" as const,
      ticket: "26000017",
      operation: "010",
      code: null,
      weight: 1,
      seconds: 1800,
      cellId: null,
      said: false,
      eventId: "e",
    };
    const yesterday = { ...earlier, startMs: ago(12 * 60), endMs: ago(9 * 60) };
    const second = { ...earlier, item: 1 };
    const { today } = shown([start, work], { earlier: [yesterday, earlier, second] });
    expect(today).toEqual({
      attendanceSeconds: 5 * 3600,
      directSeconds: 3600 + 200 * 60,
      indirectSeconds: 0,
      restSeconds: 0,
      mealSeconds: 0,
      unassignedSeconds: 40 * 60,
    });
  });

  test("tells what a lead changed since the sign-in before this one, in the lead's words", () => {
    const entered = makeEvent(
      3,
      ago(100),
      { kind: "void", event: work.id },
      { by: "2001", receivedMs: ago(90) },
    );
    const noted = { ...entered, note: "wrong ticket" };
    expect(shown([start, work, noted], { seenMs: ago(95) }).changes).toEqual([
      { kind: "void", at: new Date(ago(100)).toISOString(), by: "2001", note: "wrong ticket" },
    ]);
    expect(shown([start, work, noted], { seenMs: ago(90) }).changes).toEqual([]);
    expect(shown([start, work, noted]).events.at(-1)).not.toHaveProperty("note");
  });

  test("lists open questions of the fold and of the judge", () => {
    const again = makeEvent(3, ago(10), { kind: "shift-start" });
    const judged = [
      { code: "wrong-cell", subject: "e", atMs: ago(5), settled: false },
      { code: "over-count", subject: "f", atMs: ago(5), settled: true },
    ];
    expect(shown([start, again], { judged }).looseEnds.map(({ code }) => code)).toEqual([
      "already-in",
      "wrong-cell",
    ]);
  });

  test("hands the kiosk the events since the last gap that no shift spans, in order", () => {
    const before = makeEvent(4, ago(20 * 60), { kind: "shift-end" });
    const near = makeEvent(5, ago(10 * 60), { kind: "indirect", code: "x" });
    const ids = (events: LedgerEvent[]) => shown(events).events.map(({ id }) => id);
    expect(ids([work, start, before])).toEqual([start.id, work.id]);
    expect(ids([work, before, near, start])).toEqual([before.id, near.id, start.id, work.id]);
  });

  test("shows the planned shift of now or of the next hours", () => {
    const at = (hours: number) => RECEIVED_MS + hours * 3_600_000;
    const plan = (from: number, to: number) => ({ startMs: at(from), endMs: at(to) });
    const planned = (plans: Window["planned"]) =>
      shown([], { planned: plans }).planned?.start ?? null;
    expect(planned([plan(-9, -1), plan(-1, 7)])).toBe(new Date(at(-1)).toISOString());
    expect(planned([plan(11, 19)])).toBe(new Date(at(11)).toISOString());
    expect(planned([plan(12, 20)])).toBeNull();
  });

  test("offers what is next, but not what the worker is on", () => {
    const more = {
      name: "n",
      model: "Heron",
      options: [],
      quantity: 1,
      openQuantity: 1,
      dueOn: null,
    };
    const next = [
      { ...item, ...more },
      { ticket: "26000025", operation: "010", ...more },
    ];
    expect(shown([start, work], {}, next).next.map(({ ticket }) => ticket)).toEqual(["26000025"]);
  });
});
