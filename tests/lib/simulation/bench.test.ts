import { describe, expect, test } from "vitest";
import { cells } from "@/lib/demo/cells";
import { MEAL_MAX_SECONDS, otherWork, spend, tap } from "@/lib/simulation/bench";
import { eventsOf, kindsOf, makeBench, makeHall, personOf, through } from "@/tests/make/hall";

const person = personOf("Neck");

describe("tap", () => {
  test("is made now at the kiosk where the person stands, and takes a moment", () => {
    const hall = makeHall();
    const bench = { ...makeBench(hall, person), cell: "Buff" as const };
    const before = bench.at;
    const id = tap(bench, { kind: "shift-start" });
    expect(eventsOf(hall)[0]).toMatchObject({ id, kind: "shift-start", worker: person.number });
    expect(hall.record.until(Number.POSITIVE_INFINITY).events[0]?.cell).toBe("Buff");
    expect(bench.at).toBeGreaterThan(before);
  });
});

describe("spend", () => {
  test("lets the time go by, to the second", () => {
    const bench = makeBench(makeHall(), person);
    const before = bench.at;
    expect(through(spend(bench, 600))).toBe(0);
    expect(bench.at).toBe(before + 600);
  });

  test("a break that falls into it is clocked and puts the end off", () => {
    const hall = makeHall();
    const bench = makeBench(hall, person);
    const before = bench.at;
    bench.breaks = [{ at: before + 100, seconds: 1_800, kind: "meal" }];
    expect(through(spend(bench, 600))).toBe(0);
    expect(kindsOf(hall)).toEqual(["break-start", "break-end"]);
    expect(bench.at).toBeGreaterThanOrEqual(before + 2_400);
    expect(bench.at).toBeLessThan(before + 2_415);
    expect(bench.breaks).toEqual([]);
  });

  test("a meal longer than the site allows is asked about", () => {
    const hall = makeHall();
    const bench = makeBench(hall, person);
    bench.breaks = [
      { at: bench.at + 100, seconds: MEAL_MAX_SECONDS, kind: "meal" },
      { at: bench.at + 6_000, seconds: MEAL_MAX_SECONDS + 1, kind: "meal" },
    ];
    through(spend(bench, 7_000));
    const long = eventsOf(hall).filter(({ kind }) => kind === "break-start")[1]!;
    expect(hall.questions).toMatchObject([
      { worker: person.number, cell: "Neck", end: `break-long:${long.id}`, answer: "accept" },
    ]);
  });

  test("the end of the shift cuts it short and says what was left", () => {
    const bench = makeBench(makeHall(), person);
    bench.stopAt = bench.at + 200;
    expect(through(spend(bench, 600))).toBe(400);
  });

  test("yields the seconds at which it wants to be gone on with, in order", () => {
    const bench = makeBench(makeHall(), person);
    const before = bench.at;
    bench.breaks = [{ at: before + 100, seconds: 600, kind: "rest" }];
    const wanted = [...spend(bench, 300)];
    expect(wanted[0]).toBe(before + 100);
    expect(wanted).toEqual([...wanted].sort((a, b) => a - b));
    expect(wanted).toHaveLength(3);
  });
});

describe("otherWork", () => {
  test("goes under the code given, else under one that is usual in the home cell", () => {
    const hall = makeHall();
    const bench = makeBench(hall, person);
    through(otherWork(bench, 10, "meeting"));
    through(otherWork(bench, 10));
    const codes = eventsOf(hall).map((event) => (event.kind === "indirect" ? event.code : ""));
    expect(codes[0]).toBe("meeting");
    expect(cells.find(({ name }) => name === "Neck")!.otherWork).toContain(codes[1]);
  });
});
