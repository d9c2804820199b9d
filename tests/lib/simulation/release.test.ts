import { describe, expect, test } from "vitest";
import { readCode } from "@/lib/codes/read-code";
import { models, NEW_MODEL } from "@/lib/demo/models";
import { routingOf } from "@/lib/demo/operations";
import { randomFrom } from "@/lib/demo/random";
import { dayOf, releaserOf } from "@/lib/simulation/release";
import { calendar } from "@/tests/make/hall";

const many = (at: number) => {
  const releaser = releaserOf(calendar, randomFrom("release"));
  return Array.from({ length: 1_000 }, () => releaser.release(at));
};

describe("releaserOf", () => {
  test("numbers rise, are right and belong to the year of the release", () => {
    const numbers = many(calendar.endsAt).map(({ number }) => number);
    expect(numbers).toEqual([...new Set(numbers)].sort());
    for (const number of numbers) {
      expect(readCode(number)).toMatchObject({ valid: true, kind: "ticket" });
      expect(number.slice(0, 2)).toBe("26");
    }
  });

  test("models come by their share; the new one only when it has come to the floor", () => {
    const early = many(calendar.startsAt - 20 * 86_400);
    expect(early.some(({ model }) => model.name === NEW_MODEL)).toBe(false);
    const late = many(calendar.endsAt);
    for (const { name, share } of models) {
      const found = late.filter(({ model }) => model.name === name).length / 1_000;
      expect(Math.abs(found - share)).toBeLessThan(0.05);
    }
  });

  test("a ticket has the whole routing for its lot, and some of it behind it if so asked", () => {
    const [ticket] = many(calendar.endsAt);
    expect(ticket!.steps.map(({ operation }) => operation)).toEqual(routingOf(ticket!.model));
    expect(ticket!.steps[0]!.toDo).toHaveLength(ticket!.lot);
    const half = releaserOf(calendar, randomFrom("half")).release(calendar.endsAt, 0.5);
    expect(half.current).toBe(Math.floor(half.steps.length / 2));
  });

  test("an order is one ticket or several, all promised for the same day weeks ahead", () => {
    const orders = new Map<string, Set<string>>();
    for (const { order, dueOn } of many(calendar.endsAt)) {
      orders.set(order, (orders.get(order) ?? new Set()).add(dueOn));
    }
    expect(orders.size).toBeGreaterThan(400);
    expect(orders.size).toBeLessThan(600);
    expect([...orders.values()].every((dates) => dates.size === 1)).toBe(true);
  });
});

describe("dayOf", () => {
  test("counts days from the first of the history", () => {
    expect(dayOf(calendar, calendar.startsAt)).toBe(0);
    expect(dayOf(calendar, calendar.startsAt - 1)).toBe(-1);
    expect(dayOf(calendar, calendar.endsAt)).toBe(calendar.today);
  });
});
