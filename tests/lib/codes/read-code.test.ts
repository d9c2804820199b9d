import { describe, expect, test } from "vitest";
import { readCode } from "@/lib/codes/read-code";

const unknownForm = { valid: false, kind: null, number: null, problem: "form" };

describe("readCode", () => {
  test.each([
    "T26048176",
    "t26048176",
    "26048176",
    "26-04817-6",
    "26 04817 6",
    " T 26-04817-6\r\n",
    "26–04817−6",
  ])("%j is ticket 26048176", (text) => {
    expect(readCode(text)).toEqual({ valid: true, kind: "ticket", number: "26048176" });
  });
  test.each(["W5724", "w5724", "w 572-4"])("%j is the badge of worker 572", (text) => {
    expect(readCode(text)).toEqual({ valid: true, kind: "badge", number: "572" });
  });
  test("C5724 is carrier 572", () => {
    expect(readCode("C5724")).toEqual({ valid: true, kind: "carrier", number: "572" });
  });
  test.each([
    ["26048177", "ticket", "26048177"],
    ["T26048167", "ticket", "26048167"],
    ["W5725", "badge", "572"],
    ["C0724", "carrier", "072"],
  ])("%s has a wrong check digit and keeps its digits", (text, kind, number) => {
    expect(readCode(text)).toEqual({ valid: false, kind, number, problem: "check" });
  });
  test.each([
    "",
    " - ",
    "T",
    "hello",
    "2604817",
    "T2604817",
    "2604817600000000",
    "W5",
    "W1234567890",
    "X5724",
    "TT26048176",
    "26048176T",
    "26.04817.6",
    "https://example.org/26048176",
    "２６０４８１７６",
  ])("%j is no code of ours", (text) => expect(readCode(text)).toEqual(unknownForm));
});
