import { describe, expect, test } from "vitest";
import { benchView } from "@/lib/bench/view";
import type { Bench } from "@/lib/kiosks/schema";
import type { ClockEvent } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";
import { benchOf, device, HERON, NIA, TestKiosk, WREN } from "@/tests/make/bench";

/** The same records as the server sends them back, booked. */
function booked(events: readonly ClockEvent[], weights: number[] = []): Bench["events"] {
  return events.map(({ id, session, at, clock, worker: _, v: __, ...body }) => ({
    id,
    atMs: instantMs(at) ?? Number.NaN,
    seq: clock.seq,
    kiosk: device.deviceId,
    session,
    cell: "Neck",
    by: null,
    receivedMs: 0,
    weights: "items" in body ? weights : [],
    questions: [],
    body,
  }));
}

describe("benchView", () => {
  test("knows nothing of a worker whom neither the server nor this tablet has seen", () => {
    expect(benchView(TestKiosk.atDoor().state, "77")).toMatchObject({
      isKnown: false,
      shiftStart: null,
      doing: null,
      items: [],
    });
  });

  test("shows a tap at once, and the same once it is answered", () => {
    const kiosk = TestKiosk.atWork().touch(600);
    const waiting = kiosk.view;
    const { pending } = kiosk.state;
    const bench = benchOf({ events: booked(pending, [2400]) });
    const ids = pending.map(({ id }) => id);
    kiosk.send({ on: "settled", ids, benches: { [NIA]: bench } });
    const { segments, today, shiftStart, doing, since } = kiosk.view;
    expect({ shiftStart, since, today }).toEqual({
      shiftStart: waiting.shiftStart,
      since: waiting.since,
      today: waiting.today,
    });
    expect(segments.map(({ start, end }) => [start, end])).toEqual(
      waiting.segments.map(({ start, end }) => [start, end]),
    );
    expect(doing).toMatchObject({ kind: "work", items: [{ ticket: HERON }] });
  });

  test("a record that is both kept here and answered counts once", () => {
    const kiosk = TestKiosk.atWork().touch(600);
    const bench = benchOf({ events: booked(kiosk.state.pending, [2400]) });
    const before = kiosk.view.today;
    kiosk.send({ on: "bench", worker: NIA, bench });
    expect(kiosk.view.today).toEqual(before);
  });

  test("every second of the shift is in one part of the day", () => {
    const kiosk = TestKiosk.atWork().touch(1000);
    kiosk.send({ on: "show-break" }, { on: "break", break: "meal" }).touch(700);
    kiosk.send({ on: "stay" }, { on: "end-break" }).touch(200);
    kiosk.send({ on: "stay" }, { on: "show-other-work" }, { on: "other-work", code: "cleaning" });
    const { today, shiftStart } = kiosk.touch(300).view;
    const { directSeconds, indirectSeconds, restSeconds, unassignedSeconds, mealSeconds } = today;
    const span = Math.floor(kiosk.nowMs / 1000) - (shiftStart ?? 0);
    expect(today.attendanceSeconds).toBe(
      directSeconds + indirectSeconds + restSeconds + unassignedSeconds,
    );
    expect(today.attendanceSeconds + mealSeconds).toBe(span);
    expect({ directSeconds, mealSeconds, indirectSeconds }).toEqual({
      directSeconds: 60 + 1000 + 200,
      mealSeconds: 700,
      indirectSeconds: 300,
    });
  });

  test("a break keeps what it interrupted in sight", () => {
    const kiosk = TestKiosk.atWork().send({ on: "show-break" }, { on: "break", break: "rest" });
    expect(kiosk.touch(60).view).toMatchObject({
      doing: { kind: "rest" },
      items: [{ ticket: HERON }],
      activity: "run",
      resumes: { kind: "work" },
      previous: null,
    });
  });

  test("what was reported done is not gone back to, what was put aside is", () => {
    const kiosk = TestKiosk.atWork().take(WREN, true).send({ on: "stay" }).touch(60);
    kiosk.send({ on: "count" }, { on: "pick-item", item: { ticket: HERON, operation: "120" } });
    kiosk.send({ on: "counted", stop: true }, { on: "stay" }).touch(60);
    kiosk.send({ on: "show-other-work" }, { on: "other-work", code: "cleaning" });
    expect(kiosk.touch(60).view.previous).toMatchObject({ items: [{ ticket: WREN }] });
    const done = TestKiosk.atWork().send({ on: "count" }, { on: "counted", stop: true });
    expect(done.touch(60).view.previous).toBeNull();
  });

  test("the activity that may be moved is the running one, else the last of the shift", () => {
    const kiosk = TestKiosk.atWork();
    const work = kiosk.last?.id;
    expect(kiosk.view.activityEvent).toBe(work);
    kiosk.send({ on: "count" }, { on: "counted", stop: true });
    expect(kiosk.touch(60).view.activityEvent).toBe(work);
    expect(TestKiosk.atBench().view.activityEvent).toBeNull();
  });

  test("the planned shift is the server's, in epoch seconds", () => {
    expect(TestKiosk.atBench().view.planned).toEqual({
      start: Date.UTC(2026, 4, 14, 12) / 1000,
      end: Date.UTC(2026, 4, 14, 20, 30) / 1000,
    });
  });
});
