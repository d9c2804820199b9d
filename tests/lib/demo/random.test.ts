import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { randomFrom, uuidAt } from "@/lib/demo/random";
import { sum } from "@/lib/sum";

const many = 2_000;
const draws = <T>(draw: () => T) => Array.from({ length: many }, draw);

describe("randomFrom", () => {
  test("for any seed, the same stream comes again, and another seed gives another", () => {
    fc.assert(
      fc.property(fc.string(), (seed) => {
        const [one, again, other] = [randomFrom(seed), randomFrom(seed), randomFrom(`${seed}.`)];
        const first = Array.from({ length: 8 }, () => one.next());
        expect(Array.from({ length: 8 }, () => again.next())).toEqual(first);
        expect(Array.from({ length: 8 }, () => other.next())).not.toEqual(first);
      }),
    );
  });

  test("for any seed, numbers stay from 0 up to 1 and spread evenly", () => {
    fc.assert(
      fc.property(fc.string(), (seed) => {
        const random = randomFrom(seed);
        const numbers = draws(() => random.next());
        expect(numbers.every((number) => number >= 0 && number < 1)).toBe(true);
        expect(sum(numbers) / many).toBeGreaterThan(0.45);
        expect(sum(numbers) / many).toBeLessThan(0.55);
      }),
      { numRuns: 20 },
    );
  });

  test("whole numbers reach both ends", () => {
    const random = randomFrom("ends");
    expect(new Set(draws(() => random.whole(2, 4)))).toEqual(new Set([2, 3, 4]));
  });

  test("a chance of 0 never comes and one of 1 always does", () => {
    const random = randomFrom("chance");
    expect(draws(() => random.chance(0))).not.toContain(true);
    expect(draws(() => random.chance(1))).not.toContain(false);
  });

  test("weights decide how often something is picked, and a weight of 0 keeps it out", () => {
    const random = randomFrom("weights");
    const picked = draws(() => random.pickBy([0, 1, 3], (weight) => weight));
    expect(picked).not.toContain(0);
    const threes = picked.filter((each) => each === 3).length / many;
    expect(threes).toBeGreaterThan(0.7);
    expect(threes).toBeLessThan(0.8);
  });

  test("work times spread around 1: half of them below, none at 0", () => {
    const random = randomFrom("spread");
    const factors = draws(() => random.spread(0.14));
    const below = factors.filter((factor) => factor < 1).length / many;
    expect(below).toBeGreaterThan(0.45);
    expect(below).toBeLessThan(0.55);
    expect(Math.min(...factors)).toBeGreaterThan(0.5);
  });

  test("refuses to pick from nothing", () => {
    expect(() => randomFrom("none").pick([])).toThrow("something to pick from");
    expect(() => randomFrom("none").pickBy([1], () => 0)).toThrow("something to pick from");
  });
});

describe("uuidAt", () => {
  test("makes version 7 ids that carry the instant and differ", () => {
    const random = randomFrom("ids");
    const ids = draws(() => uuidAt(1_700_000_000_000, random));
    expect(new Set(ids).size).toBe(many);
    for (const id of ids) expect(z.uuidv7().safeParse(id).success).toBe(true);
    expect(ids[0]!.slice(0, 13)).toBe("018bcfe5-6800");
  });
});
