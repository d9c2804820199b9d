import { describe, expect, test } from "vitest";
import { draftedOf, entryOf, formErrors } from "@/lib/replay/drafted";
import { standardsQuery } from "@/lib/standards/schema";

const row = {
  seq: 1,
  option: null,
  effectiveFrom: "2026-03-02",
  setupSeconds: 360,
  runSeconds: 3000,
};
const facts = {
  isInRouting: true,
  isOption: true,
  modelSince: "2026-03-02",
  today: "2026-05-14",
  rows: [row],
};
const said = {
  model: "Curlew",
  op: "110",
  setup: "6.0",
  run: "82.0",
  from: "2026-05-18",
  reason: "Five-piece neck",
};
const drafted = (change: Partial<typeof said>) =>
  draftedOf(standardsQuery.parse({ ...said, ...change }), facts);

describe("draftedOf", () => {
  test("reads a change that may be set", () => {
    expect(drafted({})).toEqual({
      entry: {
        model: "Curlew",
        operation: "110",
        option: null,
        setupSeconds: 360,
        runSeconds: 4920,
        effectiveFrom: "2026-05-18",
        reason: "Five-piece neck",
      },
      errors: {},
    });
  });

  test("an operation that is only looked at is no draft", () => {
    expect(drafted({ setup: "", run: "", from: "", reason: "" })).toBeNull();
  });

  test.each<[Partial<typeof said>, string, string]>([
    [{ run: "soon" }, "run", "Give minutes, such as 12.5."],
    [{ run: "-1" }, "run", "A standard is time that work takes: give 0 or more."],
    [{ run: "0" }, "run", "A standard of 0 earns nothing."],
    [{ setup: "6", run: "50" }, "run", "the standard of that day already"],
    [{ from: "" }, "from", "Give a date."],
    [{ from: "2026-03-01" }, "from", "known here since 2026-03-02"],
    [{ reason: "" }, "reason", "Fill this in."],
  ])("%j is refused at its field %s: %s", (change, field, words) => {
    expect(drafted(change)).toMatchObject({
      entry: null,
      errors: { [field]: expect.stringContaining(words) },
    });
  });
});

describe("entryOf", () => {
  test("names the fields as the contract does", () => {
    const form = { model: "Heron", operation: "110", option: null, reason: "Study" };
    expect(entryOf({ ...form, setup: 60, run: 120, from: "2026-05-18" })).toEqual({
      ...form,
      setupSeconds: 60,
      runSeconds: 120,
      effectiveFrom: "2026-05-18",
    });
  });
});

describe("formErrors", () => {
  test("names a refusal's fields as the form does, and leaves what it does not know", () => {
    const errors = [
      { path: "runSeconds", message: "a" },
      { path: "operation", message: "b" },
    ];
    expect(formErrors(errors).map(({ path }) => path)).toEqual(["run", "operation"]);
  });
});
