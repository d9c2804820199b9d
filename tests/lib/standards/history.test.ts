import { describe, expect, test } from "vitest";
import { standardHistory } from "@/lib/standards/history";

const row = (seq: number, effectiveFrom: string) => ({
  seq,
  effectiveFrom,
  option: null,
  setupSeconds: 0,
  runSeconds: seq,
});
const told = (day: string, ...rows: ReturnType<typeof row>[]) =>
  standardHistory(rows, day).map(({ seq, state, until }) => [seq, state, until]);

describe("standardHistory", () => {
  test("the latest comes first, each held until the next one's day", () => {
    const rows = [row(1, "2025-01-06"), row(3, "2026-05-18"), row(2, "2026-01-05")];
    expect(told("2026-05-14", ...rows)).toEqual([
      [3, "to-come", null],
      [2, "in-force", "2026-05-18"],
      [1, "over", "2026-01-05"],
    ]);
    expect(told("2026-05-18", ...rows)[0]).toEqual([3, "in-force", null]);
  });

  test("of two for one day the later entry counts, and the other one stays visible", () => {
    expect(told("2026-06-01", row(1, "2026-05-18"), row(2, "2026-05-18"))).toEqual([
      [2, "in-force", null],
      [1, "replaced", null],
    ]);
  });

  test("an entry made later for an earlier day takes its place by day", () => {
    expect(told("2026-05-14", row(1, "2026-01-05"), row(2, "2025-01-06"))).toEqual([
      [1, "in-force", null],
      [2, "over", "2026-01-05"],
    ]);
  });

  test("nothing entered is nothing", () => expect(told("2026-05-14")).toEqual([]));
});
