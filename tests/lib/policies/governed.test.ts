import { describe, expect, test } from "vitest";
import { governedWeeks } from "@/lib/policies/governed";
import { policyLabel } from "@/lib/policies/in-force";
import { zoneClock } from "@/lib/time/zone-clock";
import { makePolicyBook, makeVersion, ZONE } from "@/tests/make/policies";

const clock = zoneClock(ZONE);
/** 7 June 2026 is a Sunday. */
const range = { from: "2026-06-10", to: "2026-06-24" };
const shown = (book: Parameters<typeof governedWeeks>[0], dates = range) =>
  governedWeeks(book, "w1", dates, clock).map(({ week, version, overlap }) => {
    return [week.date, policyLabel(version), overlap && (overlap.end - overlap.start) / 86_400];
  });

describe("governedWeeks", () => {
  test("whole workweeks that the range touches, by the policy's own weekday", () => {
    expect(shown(makePolicyBook())).toEqual([
      ["2026-06-07", "us-federal 1", null],
      ["2026-06-14", "us-federal 1", null],
      ["2026-06-21", "us-federal 1", null],
    ]);
  });
  test("a version that begins inside a workweek governs from the next one on", () => {
    const book = makePolicyBook([
      makeVersion("2026-01-01"),
      makeVersion("2026-06-15", { version: 2 }),
    ]);
    expect(shown(book).map(([, label]) => label)).toEqual([
      "us-federal 1",
      "us-federal 1",
      "us-federal 2",
    ]);
  });
  test("one that begins with a workweek governs that one", () => {
    const book = makePolicyBook([
      makeVersion("2026-01-01"),
      makeVersion("2026-06-14", { version: 2 }),
    ]);
    expect(shown(book)[1]).toEqual(["2026-06-14", "us-federal 2", null]);
  });
  test("a worker's move to another policy begins with the next workweek", () => {
    const shop = makeVersion("2026-01-01", {
      name: "shop",
      policy: { workweek: { startsOn: "sunday" } },
    });
    const move = { worker: "w1", policy: "shop", effectiveOn: "2026-06-16" };
    const book = makePolicyBook([makeVersion("2026-01-01"), shop], [move]);
    expect(shown(book).map(([, label]) => label)).toEqual([
      "us-federal 1",
      "us-federal 1",
      "shop 1",
    ]);
    expect(governedWeeks(book, "w2", range, clock).at(-1)!.version.name).toBe("us-federal");
  });
  const moved = makePolicyBook([
    makeVersion("2026-01-01"),
    makeVersion("2026-06-16", { version: 2, policy: { workweek: { startsOn: "friday" } } }),
  ]);
  test("a changed start: the old workweek runs out, the new one overlaps it", () => {
    expect(shown(moved)).toEqual([
      ["2026-06-07", "us-federal 1", null],
      ["2026-06-14", "us-federal 1", null],
      ["2026-06-19", "us-federal 2", 2],
    ]);
  });
  test("a range that begins after the old one still gets it, as both decide the pay", () => {
    expect(shown(moved, { from: "2026-06-22", to: "2026-06-27" })).toEqual([
      ["2026-06-14", "us-federal 1", null],
      ["2026-06-19", "us-federal 2", 2],
      ["2026-06-26", "us-federal 2", null],
    ]);
  });
  test("another hour of the same weekday is a changed start too", () => {
    const at = { startsOn: "sunday" as const, at: "07:00" };
    const book = makePolicyBook([
      makeVersion("2026-01-01"),
      makeVersion("2026-06-10", { version: 2, policy: { workweek: at } }),
    ]);
    const [, second] = governedWeeks(book, null, range, clock);
    expect(second!.week.date).toBe("2026-06-07");
    expect(second!.overlap!.end - second!.overlap!.start).toBe((7 * 24 - 7) * 3600);
  });
  test("nothing where no policy was chosen", () => {
    expect(shown({ versions: [], choices: [] })).toEqual([]);
  });
});
