import { describe, expect, test } from "vitest";
import { rowsUnder, rowsWith } from "@/lib/replay/draft";
import { standardInForce } from "@/lib/standards/in-force";

const base = {
  seq: 1,
  option: null,
  effectiveFrom: "2026-01-05",
  setupSeconds: 360,
  runSeconds: 3000,
};
const adder = { ...base, seq: 2, option: "Inlay", setupSeconds: 0, runSeconds: 600 };
const draft = {
  option: null,
  setupSeconds: 300,
  runSeconds: 5000,
  effectiveFrom: "2026-05-18",
};
const runOf = (rows: Parameters<typeof standardInForce>[0], day: string) =>
  standardInForce(rows, day, ["Inlay"])?.runSeconds;

describe("rowsWith", () => {
  test("the draft counts from its day, as the latest entry for it, and not before", () => {
    const same = { ...base, seq: 3, effectiveFrom: "2026-05-18", runSeconds: 4000 };
    const rows = rowsWith(draft, [base, adder, same]);
    expect(runOf(rows, "2026-05-17")).toBe(3600);
    expect(runOf(rows, "2026-05-18")).toBe(5600);
  });
});

describe("rowsUnder", () => {
  test("the draft holds on every day in place of its like; adders of other options stay", () => {
    const rows = rowsUnder(draft, [base, adder]);
    expect(runOf(rows, "2026-01-05")).toBe(5600);
    expect(runOf(rows, "2030-01-01")).toBe(5600);
  });
  test("a drafted adder leaves the base and its days alone", () => {
    const rows = rowsUnder({ ...draft, option: "Inlay" }, [base, adder]);
    expect(runOf(rows, "2026-01-05")).toBe(8000);
    expect(runOf(rows, "2026-01-04")).toBeUndefined();
  });
});
