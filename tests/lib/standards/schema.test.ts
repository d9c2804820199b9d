import { describe, expect, test } from "vitest";
import { standardEntry, standardForm, standardsQuery } from "@/lib/standards/schema";

const entry = {
  model: "Heron",
  operation: "110",
  setupSeconds: 360,
  runSeconds: 4920,
  effectiveFrom: "2026-05-18",
  reason: "Time study",
};
const form = {
  id: "01a2327a-ce56-70c9-b8cc-64010002011f",
  model: "Heron",
  operation: "110",
  option: "",
  setup: "6.0",
  run: "82,5",
  from: "2026-05-18",
  reason: " Time study ",
};
const complaints = (schema: typeof standardEntry | typeof standardForm, change: object) => {
  const base = schema === standardEntry ? entry : form;
  const read = schema.safeParse({ ...base, ...change });
  return read.error?.issues.map(({ path, message }) => `${path.join(".")}: ${message}`) ?? [];
};

describe("standardEntry", () => {
  test("without an option is the base", () => {
    expect(standardEntry.parse(entry)).toEqual({ ...entry, option: null });
  });
  test.each([
    [{ runSeconds: -60 }, "runSeconds: A standard is time that work takes: give 0 or more."],
    [{ setupSeconds: 0.5 }, "setupSeconds: Give whole seconds."],
    [{ runSeconds: 360_001 }, "runSeconds: Give at most 100 hours."],
    [{ effectiveFrom: "2026-02-30" }, "effectiveFrom: Give a date."],
    [{ reason: " " }, "reason: Fill this in."],
  ])("refuses %j: %s", (change, words) =>
    expect(complaints(standardEntry, change)).toEqual([words]),
  );
});

describe("standardForm", () => {
  test("reads minutes as whole seconds, and no option as the base", () => {
    expect(standardForm.parse(form)).toMatchObject({
      setup: 360,
      run: 4950,
      option: null,
      reason: "Time study",
    });
  });
  test.each([
    [{ run: "-5" }, "run: A standard is time that work takes: give 0 or more."],
    [{ run: "" }, "run: Give minutes, such as 12.5."],
    [{ setup: "ten" }, "setup: Give minutes, such as 12.5."],
    [{ run: "6001" }, "run: Give at most 100 hours."],
  ])("refuses %j: %s", (change, words) =>
    expect(complaints(standardForm, change)).toEqual([words]),
  );
});

describe("standardsQuery", () => {
  test("anything odd in the address counts as not said", () => {
    expect(standardsQuery.parse({ model: ["a"], on: "yesterday", op: "110", run: "82" })).toEqual({
      model: "",
      stage: "",
      on: "",
      op: "110",
      option: "",
      setup: "",
      run: "82",
      from: "",
      reason: "",
      set: "",
    });
  });
});
