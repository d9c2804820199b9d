import { describe, expect, test } from "vitest";
import { makeClock } from "@/kiosk/clock";

/** Clocks that a test moves by hand. */
function hands(wallMs: number, monotonicMs: number) {
  const at = { wallMs, monotonicMs };
  return {
    at,
    clocks: { wallMs: () => at.wallMs, monotonicMs: () => at.monotonicMs },
    pass(ms: number) {
      at.wallMs += ms;
      at.monotonicMs += ms;
    },
  };
}

const trip = (sent: number, got: number, gotWallMs: number, serverMs: number) => ({
  sentMonotonicMs: sent,
  gotMonotonicMs: got,
  gotWallMs,
  serverMs,
});

describe("makeClock", () => {
  test("says that it knows no offset before the first round trip", () => {
    const { clocks } = hands(1_000_000, 500);
    expect(makeClock(clocks, "b").stamp()).toEqual({
      atMs: 1_000_000,
      clock: { offsetMs: null, uncertaintyMs: null, boot: "b", monotonicMs: 500 },
    });
  });

  test("takes the server's time in the middle of the round trip, give or take half", () => {
    const { clocks } = hands(1_000_100, 600);
    const clock = makeClock(clocks, "b");
    clock.measured(trip(500, 600, 1_000_100, 1_300_000));
    const stamp = clock.stamp();
    expect(stamp.atMs).toBe(1_300_050);
    expect(stamp.clock.offsetMs).toBe(1_300_050 - 1_000_100);
    expect(stamp.clock.uncertaintyMs).toBe(51);
  });

  test("an act's instant is always tablet time plus the offset it carries", () => {
    const { clocks, pass, at } = hands(1_000_000, 0);
    const clock = makeClock(clocks, "b");
    clock.measured(trip(-30, 0, 1_000_000, 990_000));
    pass(3_600_000);
    const { atMs, clock: carried } = clock.stamp();
    expect(atMs).toBe(at.wallMs + (carried.offsetMs ?? Number.NaN));
  });

  test("keeps a quick measurement against a slow one, until drift has made it worse", () => {
    const { clocks, pass } = hands(0, 0);
    const clock = makeClock(clocks, "b");
    clock.measured(trip(-10, 0, 0, 5000));
    clock.measured(trip(-400, 0, 0, 9000));
    expect(clock.nowMs()).toBe(5005);
    pass(3_600_000); // an hour drifts up to 360 ms
    clock.measured(trip(3_600_000 - 400, 3_600_000, 3_600_000, 3_605_100));
    expect(clock.nowMs()).toBe(3_605_300);
  });

  test("a tablet clock set back moves no record", () => {
    const { clocks, at, pass } = hands(1_000_000, 0);
    const clock = makeClock(clocks, "b");
    clock.measured(trip(0, 0, 1_000_000, 1_000_000));
    pass(1000);
    at.wallMs -= 3_600_000;
    expect(clock.stamp().atMs).toBe(1_001_000);
  });

  test("after a sleep it follows the wall clock and owns up to the difference", () => {
    const { clocks, at } = hands(1_000_000, 0);
    const clock = makeClock(clocks, "b");
    clock.measured(trip(0, 0, 1_000_000, 1_000_000));
    at.wallMs += 600_000;
    const stamp = clock.stamp();
    expect(stamp.atMs).toBe(1_600_000);
    expect(stamp.clock.uncertaintyMs).toBeGreaterThanOrEqual(600_000);
  });
});
