import { describe, expect, test } from "vitest";
import { randomFrom } from "@/lib/demo/random";
import { breaksOf } from "@/lib/simulation/breaks";

const hours = (length: number) => ({
  worker: "1001",
  workOn: "2026-05-14",
  day: 0,
  start: 1_000_000,
  end: 1_000_000 + length * 3_600,
  attends: true,
});

const many = (length: number) => {
  const random = randomFrom("breaks");
  return Array.from({ length: 1_000 }, () => breaksOf(hours(length), random));
};

describe("breaksOf", () => {
  test("everyone eats once in an ordinary shift and twice in a long one", () => {
    const meals = (length: number) =>
      new Set(many(length).map((each) => each.filter(({ kind }) => kind === "meal").length));
    expect(meals(8.5)).toEqual(new Set([1]));
    expect(meals(12.25)).toEqual(new Set([2]));
  });

  test("breaks come one after the other inside the shift", () => {
    for (const planned of many(8.5)) {
      const edges = planned.flatMap(({ at, seconds }) => [at, at + seconds]);
      expect(edges).toEqual([...edges].sort((a, b) => a - b));
      expect(edges.every((edge) => edge > 1_000_000 && edge < hours(8.5).end)).toBe(true);
    }
  });

  test("not every rest is clocked, and few meals run over the site's limit", () => {
    const all = many(8.5).flat();
    const rests = all.filter(({ kind }) => kind === "rest").length;
    expect(rests).toBeGreaterThan(900);
    expect(rests).toBeLessThan(1_500);
    const over = all.filter(({ kind, seconds }) => kind === "meal" && seconds > 75 * 60).length;
    expect(over).toBeGreaterThan(0);
    expect(over).toBeLessThan(20);
  });
});
