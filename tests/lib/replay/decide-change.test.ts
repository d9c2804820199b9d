import { describe, expect, test } from "vitest";
import { type ChangeFacts, decideChange } from "@/lib/replay/decide-change";
import type { StandardEntry } from "@/lib/standards/schema";

const row = {
  seq: 1,
  option: null,
  effectiveFrom: "2026-03-02",
  setupSeconds: 360,
  runSeconds: 3000,
};
const entry: StandardEntry = {
  model: "Curlew",
  operation: "110",
  option: null,
  setupSeconds: 360,
  runSeconds: 4920,
  effectiveFrom: "2026-05-18",
  reason: "Five-piece neck",
};
const facts: ChangeFacts = {
  isInRouting: true,
  isOption: true,
  modelSince: "2026-03-02",
  today: "2026-05-14",
  rows: [row],
};

describe("decideChange", () => {
  test.each<[string, Partial<StandardEntry>]>([
    ["a day to come", {}],
    ["a day that is past", { effectiveFrom: "2026-04-01" }],
    ["the model's first day", { effectiveFrom: "2026-03-02" }],
    ["a whole year ahead", { effectiveFrom: "2027-05-15" }],
    ["no setup", { setupSeconds: 0 }],
    ["an adder of nothing, which takes an adder back", { option: "Inlay", runSeconds: 0 }],
  ])("takes a standard for %s", (_name, change) => {
    expect(decideChange({ ...entry, ...change }, facts).ok).toBe(true);
  });

  test("takes the old figures again after others were set for the same day", () => {
    const later = { ...row, seq: 2, effectiveFrom: "2026-05-18", runSeconds: 4920 };
    const back = { ...entry, runSeconds: 3000 };
    expect(decideChange(back, { ...facts, rows: [row, later] }).ok).toBe(true);
  });

  test.each<[string, Partial<StandardEntry>, Partial<ChangeFacts>, string]>([
    ["runSeconds", { runSeconds: 0 }, {}, "A standard of 0 earns nothing"],
    ["effectiveFrom", { effectiveFrom: "2026-03-01" }, {}, "known here since 2026-03-02"],
    ["effectiveFrom", { effectiveFrom: "2027-05-16" }, {}, "more than a year ahead"],
    ["operation", {}, { isInRouting: false }, "Curlew has no operation 110"],
    ["option", { option: "Inlay" }, { isOption: false }, "Curlew has no option Inlay"],
    ["runSeconds", { runSeconds: 3000 }, {}, "the standard of that day already"],
  ])("refuses %s in plain words: %j %j", (path, change, known, words) => {
    expect(decideChange({ ...entry, ...change }, { ...facts, ...known })).toMatchObject({
      ok: false,
      problem: { code: "invalid", errors: [{ path, message: expect.stringContaining(words) }] },
    });
  });
});
