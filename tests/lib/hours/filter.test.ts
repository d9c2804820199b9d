import { describe, expect, test } from "vitest";
import { hoursFilter, rangeOf } from "@/lib/hours/filter";

const today = "2026-05-14";

describe("rangeOf", () => {
  test.each([
    { says: {}, from: "2026-05-08", to: "2026-05-14", because: "the week up to today" },
    {
      says: { to: "2026-05-10" },
      from: "2026-05-04",
      to: "2026-05-10",
      because: "the week before",
    },
    { says: { from: "2026-05-12" }, from: "2026-05-12", to: today, because: "up to today" },
    {
      says: { from: "2026-06-01" },
      from: "2026-06-01",
      to: "2026-06-01",
      because: "a day to come",
    },
    {
      says: { from: "2026-05-10", to: "2026-05-04" },
      from: "2026-05-04",
      to: "2026-05-10",
      because: "the wrong way round",
    },
    {
      says: { from: "2020-01-01", to: today },
      from: "2026-02-12",
      to: today,
      because: "92 days at most",
    },
  ])("$says means $from to $to: $because", ({ says, from, to }) => {
    expect(rangeOf(hoursFilter.parse(says), today)).toEqual({ from, to });
  });
});

describe("hoursFilter", () => {
  test("takes what is odd as not said", () => {
    const odd = { from: "yesterday", to: ["2026-05-14"], worker: "Ilo", day: "14", cell: 3 };
    expect(hoursFilter.parse(odd)).toEqual({ from: "", to: "", cell: "", worker: "", day: "" });
  });

  test("days that no factory has hours on count as not said, so that nobody sums for ever", () => {
    const far = { from: "0001-01-01", to: "9999-12-31" };
    expect(rangeOf(hoursFilter.parse(far), today)).toEqual({ from: "2026-05-08", to: today });
    expect(hoursFilter.parse({ cell: "Ne\0ck" }).cell).toBe("");
  });
});
