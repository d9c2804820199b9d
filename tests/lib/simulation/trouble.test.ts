import { describe, expect, test } from "vitest";
import { cast } from "@/lib/demo/cast";
import { operations } from "@/lib/demo/operations";
import { plannedShifts } from "@/lib/demo/shifts";
import { troublesOf } from "@/lib/simulation/trouble";
import { calendar, makeTraveller } from "@/tests/make/hall";

const shifts = plannedShifts(calendar, cast);
const troubles = () => troublesOf(calendar, shifts);
const operation = (code: string) => operations.find((each) => each.code === code)!;
const daysAgo = (days: number) => calendar.endsAt - days * 86_400;
const HOUR = 3_600;

describe("troublesOf", () => {
  test("five shifts are not ended, all of them over and attended, one of them lately", () => {
    const { forgetsToEnd } = troubles();
    const forgotten = shifts.filter(forgetsToEnd);
    expect(forgotten).toHaveLength(5);
    expect(forgotten.every(({ attends, end }) => attends && end < daysAgo(0.5))).toBe(true);
    expect(forgotten.some(({ end }) => end > daysAgo(6))).toBe(true);
  });

  test("one lot is taken off the rack a day after the clear coat, and pays for it at the wheel", () => {
    const { restsSeconds, mustFail } = troubles();
    const [ticket, next] = [makeTraveller({ number: "1" }), makeTraveller({ number: "2" })];
    expect(restsSeconds(ticket, operation("390"), daysAgo(20))).toBe(96 * HOUR);
    expect(restsSeconds(ticket, operation("390"), daysAgo(10))).toBe(20 * HOUR);
    expect(restsSeconds(next, operation("390"), daysAgo(9))).toBe(96 * HOUR);
    expect(mustFail(next, operation("410"), daysAgo(8))).toBe(false);
    expect(mustFail(ticket, operation("410"), daysAgo(8))).toBe(true);
    expect(mustFail(ticket, operation("410"), daysAgo(8))).toBe(false);
  });

  test("one archtop comes back from the finish check three times", () => {
    const { mustFail } = troubles();
    const archtop = makeTraveller({ number: "1", model: "Avocet" });
    const results = Array.from({ length: 5 }, () =>
      mustFail(archtop, operation("420"), daysAgo(10)),
    );
    expect(results).toEqual([true, true, true, false, false]);
    const other = makeTraveller({ number: "2", model: "Avocet" });
    expect(mustFail(other, operation("420"), daysAgo(9))).toBe(false);
  });

  test("the machines of one cell stand still for three hours of a weekday", () => {
    const { isDown } = troubles();
    const minutes = Array.from({ length: 59 * 1_440 }, (_, at) => calendar.startsAt + at * 60);
    expect(minutes.filter((at) => isDown("CNC", at))).toHaveLength(180);
    expect(minutes.some((at) => isDown("Mill", at))).toBe(false);
  });

  test("a hasty hand is hasty once a day, on two days", () => {
    const { isHasty } = troubles();
    expect(isHasty("Binding", daysAgo(3))).toBe(true);
    expect(isHasty("Binding", daysAgo(3))).toBe(false);
    expect(isHasty("Binding", daysAgo(17))).toBe(true);
    expect(isHasty("Binding", daysAgo(4))).toBe(false);
    expect(isHasty("Neck", daysAgo(3))).toBe(false);
  });

  test("what came up in the last days is still open, what is older is settled", () => {
    const { isSettled } = troubles();
    expect(isSettled(daysAgo(2))).toBe(false);
    expect(isSettled(daysAgo(9))).toBe(true);
  });

  test("a kiosk is cut off for some hours, and back before now", () => {
    const [cutOff] = troubles().cutOffs;
    expect(cutOff!.toMs - cutOff!.fromMs).toBeGreaterThan(HOUR * 1000);
    expect(cutOff!.toMs).toBeLessThan(calendar.endsAt * 1000);
  });
});
