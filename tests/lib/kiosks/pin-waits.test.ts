import { describe, expect, test } from "vitest";
import { SHUT_SECONDS, TRIES_MAX } from "@/lib/access/throttle";
import { pinWaits } from "@/lib/kiosks/pin-waits";

describe("pinWaits", () => {
  test("shuts a worker after the hundredth wrong try, on one tablet and on all together", () => {
    for (const waits of [pinWaits.pair, pinWaits.worker]) {
      expect(waits).toHaveLength(TRIES_MAX);
      expect(waits.at(-1)).toBe(SHUT_SECONDS);
    }
  });

  test("never keeps a worker from another tablet for more than a minute before that", () => {
    expect(Math.max(...pinWaits.worker.slice(0, -1))).toBe(60);
    expect(pinWaits.worker.slice(0, 9)).toEqual(Array(9).fill(0));
  });

  test("never shuts a tablet: it only grows slower for the rest of the hour", () => {
    expect(Math.max(...pinWaits.kiosk)).toBe(30);
    expect(pinWaits.kiosk.slice(28, 34)).toEqual([0, 2, 4, 8, 16, 30]);
  });

  test("grows with every wrong try", () => {
    for (const waits of Object.values(pinWaits)) {
      expect([...waits].sort((a, b) => a - b)).toEqual(waits);
    }
  });
});
