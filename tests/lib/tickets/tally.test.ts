import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { tally } from "@/lib/tickets/tally";
import { makeCount } from "@/tests/make/ticket";

const routing = ["110", "120", "130"];
const of = (quantity: number, ...reports: Parameters<typeof makeCount>[]) =>
  tally(
    { quantity, routing },
    reports.map((report) => makeCount(...report)),
  );
const row = ({ operations }: ReturnType<typeof tally>, place: number) => operations[place]!;

describe("tally", () => {
  test("nothing counted leaves the whole lot open everywhere", () => {
    expect(of(4).operations.map(({ openQuantity }) => openQuantity)).toEqual([4, 4, 4]);
  });
  test("counts are deltas, and the one that brings open to none finishes", () => {
    const counted = of(4, ["110", 1, [1]], ["110", 2, [2]], ["110", 3, [1]], ["110", 4, [1]]);
    expect(row(counted, 0)).toMatchObject({ good: 5, openQuantity: 0, finishedMs: 180_000 });
  });
  test("one piece short is not finished", () => {
    expect(row(of(4, ["110", 1, [3]]), 0)).toMatchObject({ openQuantity: 1, finishedMs: null });
  });
  test("scrap lessens its own open pieces and the quantity of all that follows", () => {
    const counted = of(4, ["110", 1, [3, 0, 1]]);
    expect(row(counted, 0)).toMatchObject({ quantity: 4, openQuantity: 0, scrap: 1 });
    expect(counted.operations.slice(1).map(({ quantity }) => quantity)).toEqual([3, 3]);
  });
  test("a piece of rework stays open until it is good", () => {
    const counted = of(2, ["110", 1, [1, 1]]);
    expect(row(counted, 0)).toMatchObject({ rework: 1, openQuantity: 1, finishedMs: null });
    expect(row(of(2, ["110", 1, [1, 1]], ["110", 2, [1]]), 0).finishedMs).toBe(120_000);
  });
  test("an earlier operation's late scrap can finish a later one", () => {
    const counted = of(4, ["120", 1, [3]], ["110", 2, [3, 0, 1]]);
    expect(row(counted, 1)).toMatchObject({ quantity: 3, openQuantity: 0, finishedMs: 120_000 });
  });
  test("the last piece lost scraps the ticket, and what follows has nothing to finish", () => {
    const counted = of(2, ["110", 1, [1, 0, 1]], ["120", 2, [0, 0, 1]], ["130", 3, [0]]);
    expect(counted.scrappedMs).toBe(120_000);
    expect(row(counted, 2)).toMatchObject({ quantity: 0, openQuantity: 0, finishedMs: null });
  });
  test("more than there is is kept, and named", () => {
    const counted = of(2, ["110", 1, [2]], ["110", 2, [1]], ["110", 3, [0]]);
    expect(row(counted, 0)).toMatchObject({ good: 3, openQuantity: 0, finishedMs: 60_000 });
    expect(counted.overCounts).toEqual(["count-110-2"]);
  });
  test("an earlier operation's scrap can make a later count too many", () => {
    const counted = of(2, ["120", 1, [2]], ["110", 2, [1, 0, 1]]);
    expect(counted.overCounts).toEqual(["count-110-2"]);
  });
  test.each<[string, [number, number?, number?], "report" | "inspect", boolean]>([
    ["a good piece", [1], "report", true],
    ["rework and scrap alone do not", [0, 1, 1], "report", false],
    ["a piece that fails inspection", [0, 1], "inspect", true],
    ["an inspection of nothing does not", [0], "inspect", false],
  ])("the setup is earned with %s", (_, counts, kind, setupEarned) => {
    expect(row(of(4, ["110", 1, counts, { kind }]), 0).setupEarned).toBe(setupEarned);
  });
  test("an operation that is not in the routing changes nothing", () => {
    expect(of(2, ["990", 1, [2]])).toEqual(of(2));
  });
  test("for any reports, open pieces are never less than none, and finished stays finished", () => {
    const report = fc.tuple(fc.constantFrom(...routing), fc.tuple(fc.nat(3), fc.nat(2), fc.nat(2)));
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 9 }), fc.array(report), (lot, reports) => {
        const rows = reports.map(([operation, counts], minute) =>
          makeCount(operation, minute, counts),
        );
        let before = tally({ quantity: lot, routing }, []);
        rows.forEach((_, index) => {
          const after = tally({ quantity: lot, routing }, rows.slice(0, index + 1));
          after.operations.forEach((one, place) => {
            expect(one.openQuantity).toBeGreaterThanOrEqual(0);
            expect(one.quantity).toBeLessThanOrEqual(lot);
            const { finishedMs } = before.operations[place]!;
            if (finishedMs !== null) expect(one.finishedMs).toBe(finishedMs);
          });
          before = after;
        });
      }),
    );
  });
});
