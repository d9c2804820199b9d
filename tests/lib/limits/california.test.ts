import { describe, expect, test } from "vitest";
import { warnCalifornia } from "@/lib/limits/california";
import { payCheck } from "@/tests/make/pay";
import { shiftOn } from "@/tests/make/shift-facts";

const check = payCheck<{ start: string }, Record<string, string>>("break-ca-meal");
const start = check.given.start;
const date = "2026-06-09";
const rests = [
  ["10:00", "10:10", "rest"],
  ["11:00", "11:10", "rest"],
  ["15:00", "15:10", "rest"],
  ["19:00", "19:10", "rest"],
] as const;

/** Codes for a shift from 08:00 with all rests taken and these meals. */
const codes = (to: string, meals: readonly (readonly [string, string])[] = []) =>
  warnCalifornia([
    shiftOn(date, start, to, [...meals.map(([a, b]) => [a, b, "meal"] as const), ...rests]),
  ]).map(({ code }) => code);

describe("warnCalifornia: meals (Labor Code 512)", () => {
  const first = check.expect.first_meal_starts_by!;
  test.each([
    ["13:00", [], []],
    ["13:01", [], ["meal-missing"]],
    ["16:30", [[first, "13:30"]], []],
    ["16:30", [["13:01", "13:31"]], ["meal-late"]],
    ["16:30", [["12:00", "12:29"]], ["meal-missing"]],
    ["18:30", [[first, "13:30"]], []],
    ["18:31", [[first, "13:30"]], ["meal-missing"]],
    [
      "19:30",
      [
        [first, "13:30"],
        ["18:00", "18:30"],
      ],
      [],
    ],
    [
      "19:30",
      [
        [first, "13:30"],
        ["18:01", "18:31"],
      ],
      ["meal-late"],
    ],
    ["19:30", [], ["meal-missing", "meal-missing"]],
  ] as const)("a shift until %s with meals at %j", (to, meals, expected) => {
    expect(codes(to, meals)).toEqual(expected);
  });
  test("a second meal that is missing and one that is late say by when it was due", () => {
    const late = warnCalifornia([
      shiftOn(date, start, "20:30", [
        ["12:00", "12:30", "meal"],
        ["19:30", "20:00", "meal"],
        ...rests,
      ]),
    ]);
    expect(late[0]?.text).toContain("second meal of 30 minutes began 11 h 30 min into the shift");
    expect(late[0]?.text).toContain("due by the end of the tenth hour");
  });
  test("time off duty as long as a meal is one", () => {
    const gap = [["12:00", "12:30", "gap"], ...rests] as const;
    expect(warnCalifornia([shiftOn(date, start, "16:30", gap)])).toEqual([]);
  });
  test("up to six hours it may have been waived, and the text says so", () => {
    const text = (to: string) => warnCalifornia([shiftOn(date, start, to, rests)])[0]?.text;
    expect(text("14:00")).toContain("may have been waived by consent");
    expect(text("14:01")).not.toContain("waived");
  });
});

describe("warnCalifornia: rests", () => {
  test.each([
    ["11:29", 0],
    ["11:30", 1],
    ["14:00", 1],
    ["14:01", 2],
    ["18:00", 2],
    ["18:01", 3],
  ])("08:00 to %s owes %i rests (Brinker v. Superior Court, 2012)", (to, due) => {
    const texts = warnCalifornia([shiftOn(date, start, to)])
      .filter(({ code }) => code === "rest-missing")
      .map(({ text }) => text);
    expect(texts).toEqual(due === 0 ? [] : [expect.stringContaining(`0 of ${due} rests`)]);
  });
  test("a rest of nine minutes is none", () => {
    const short = [["10:00", "10:09", "rest"]] as const;
    expect(warnCalifornia([shiftOn(date, start, "12:00", short)])).toHaveLength(1);
  });
});

describe("warnCalifornia: premium hours (Labor Code 226.7)", () => {
  test("at most one of each sort is proposed a workday", () => {
    const texts = warnCalifornia([
      shiftOn(date, start, "19:30"),
      shiftOn("2026-06-10", start, "14:30"),
    ]).map(({ code, date: on, text }) => [on, code, text.includes("is proposed")]);
    expect(texts).toEqual([
      ["2026-06-09", "meal-missing", true],
      ["2026-06-09", "meal-missing", false],
      ["2026-06-09", "rest-missing", true],
      ["2026-06-10", "meal-missing", true],
      ["2026-06-10", "rest-missing", true],
    ]);
  });
});
