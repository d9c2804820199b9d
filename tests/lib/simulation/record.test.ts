import { describe, expect, test } from "vitest";
import { randomFrom } from "@/lib/demo/random";
import { recordOf } from "@/lib/simulation/record";

const second = 1_778_760_000;
const record = (cutOffs: Parameters<typeof recordOf>[1] = []) => recordOf(randomFrom("r"), cutOffs);
const start = { cell: "Neck", worker: "1042", shift: 1, body: { kind: "shift-start" } } as const;
const end = { ...start, body: { kind: "shift-end" } } as const;

describe("recordOf", () => {
  test("keeps taps under the id it answered, in the order of time", () => {
    const taps = record();
    const later = taps.tap({ ...end, at: second + 60 });
    const earlier = taps.tap({ ...start, at: second });
    const { events } = taps.until(Number.POSITIVE_INFINITY);
    expect(events.map(({ event }) => event.id)).toEqual([earlier, later]);
    expect(events.map(({ event }) => event.clock.seq)).toEqual([1, 2]);
    expect(Math.floor(Date.parse(events[0]!.event.at) / 1000)).toBe(second);
  });

  test("one shift at one kiosk is one session, which ends with the shift", () => {
    const taps = record();
    taps.tap({ ...start, at: second });
    taps.tap({ ...start, at: second + 10, cell: "Buff", body: { kind: "indirect", code: "jigs" } });
    taps.tap({ ...end, at: second + 60 });
    taps.tap({ ...start, at: second + 90_000, shift: 2 });
    const { sessions, events } = taps.until(Number.POSITIVE_INFINITY);
    expect(sessions.map(({ cell, endedAtMs }) => [cell, endedAtMs !== null])).toEqual([
      ["Neck", true],
      ["Buff", false],
      ["Neck", false],
    ]);
    expect(sessions[0]!.openedAtMs).toBeLessThan(Date.parse(events[0]!.event.at));
    expect(new Set(events.map(({ event }) => event.session)).size).toBe(3);
  });

  test("the server has each shortly after the tap, and nothing that comes after now", () => {
    const taps = record();
    taps.tap({ ...start, at: second });
    const [only] = taps.until(Number.POSITIVE_INFINITY).events;
    const waited = only!.receivedAtMs - Date.parse(only!.event.at);
    expect(waited).toBeGreaterThan(0);
    expect(waited).toBeLessThan(2_000);
    expect(taps.until(only!.receivedAtMs - 1)).toEqual({ events: [], sessions: [] });
  });

  test("a kiosk that was cut off hands in when it is back, the others at once", () => {
    const toMs = (second + 7_200) * 1000;
    const taps = record([{ cell: "Spray", fromMs: second * 1000, toMs }]);
    taps.tap({ ...start, at: second + 60, cell: "Spray" });
    taps.tap({ ...start, at: second + 60, cell: "Neck" });
    const received = taps.until(Number.POSITIVE_INFINITY).events.map((each) => each.receivedAtMs);
    expect(Math.max(...received)).toBeGreaterThan(toMs);
    expect(Math.min(...received)).toBeLessThan((second + 120) * 1000);
  });
});
