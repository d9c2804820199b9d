import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { readCode } from "@/lib/codes/read-code";
import { showTicket, ticketCode, ticketNumberOf } from "@/lib/codes/ticket-code";

describe("ticketNumberOf", () => {
  test.each([
    [2026, 4817, "26048176"],
    [26, 4817, "26048176"],
    [2100, 0, "00000000"],
  ])("of year %i and running number %i is %s", (year, running, number) => {
    expect(ticketNumberOf(year, running)).toBe(number);
  });
  test("a running number above five digits makes a longer number", () => {
    expect(ticketNumberOf(2026, 123_456)).toMatch(/^26123456\d$/);
  });
  test("for any year and running number, the code and what people read are the same ticket", () => {
    fc.assert(
      fc.property(fc.nat(9999), fc.nat(999_999_999_999), (year, running) => {
        const number = ticketNumberOf(year, running);
        expect(readCode(ticketCode(number))).toEqual({ valid: true, kind: "ticket", number });
        expect(readCode(showTicket(number))).toEqual({ valid: true, kind: "ticket", number });
      }),
    );
  });
  test.each([
    [26.5, 1, "year"],
    [-1, 1, "year"],
    [2026, -1, "running"],
    [2026, 1.5, "running"],
    [2026, 1_000_000_000_000, "too long"],
  ])("refuses year %d and running number %d", (year, running, why) => {
    expect(() => ticketNumberOf(year, running)).toThrow(why);
  });
});

describe("showTicket", () => {
  test.each([
    ["26048176", "26-04817-6"],
    ["261234567", "26-123456-7"],
    ["2604", "2604"],
    ["T26048176", "T26048176"],
    ["", ""],
  ])("shows %j as %j", (number, shown) => expect(showTicket(number)).toBe(shown));
});
