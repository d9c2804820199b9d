import { describe, expect, test } from "vitest";
import { type EnteredRow, standardLines } from "@/lib/standards/lines";

const routing = [
  { operation: "010", name: "Joint top", stage: "Body" },
  { operation: "110", name: "Carve neck", stage: "Neck" },
];
const row = (seq: number, change: Partial<EnteredRow>): EnteredRow => ({
  seq,
  id: `row-${seq}`,
  operation: "110",
  option: null,
  effectiveFrom: "2026-01-05",
  setupSeconds: 360,
  runSeconds: 3000,
  reason: "Time study",
  enteredBy: "Ilo Varn",
  ...change,
});

describe("standardLines", () => {
  test("gives each operation the base in force, and says which options add to it", () => {
    const [first, second] = standardLines(
      routing,
      [
        row(1, {}),
        row(2, { effectiveFrom: "2026-05-18", runSeconds: 4920 }),
        row(3, { option: "Inlay", setupSeconds: 0, runSeconds: 600 }),
        row(4, { option: "Binding", setupSeconds: 0, runSeconds: 0 }),
      ],
      "2026-05-14",
    );
    expect(first).toMatchObject({ operation: "010", inForce: null, options: [], changesOn: null });
    expect(second).toMatchObject({
      inForce: { seq: 1, runSeconds: 3000 },
      options: ["Inlay"],
      changesOn: "2026-05-18",
    });
  });

  test("names the nearest change of several that are to come", () => {
    const [, line] = standardLines(
      routing,
      [row(1, { effectiveFrom: "2026-07-01" }), row(2, { effectiveFrom: "2026-06-01" })],
      "2026-05-14",
    );
    expect(line).toMatchObject({ inForce: null, changesOn: "2026-06-01" });
  });
});
