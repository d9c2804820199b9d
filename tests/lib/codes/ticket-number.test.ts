import { describe, expect, test } from "vitest";
import { decideTicketNumber } from "@/lib/codes/ticket-number";

describe("decideTicketNumber", () => {
  test.each(["26048176", "T26048176", "26-04817-6"])("%s is 26048176", (text) => {
    expect(decideTicketNumber(text)).toEqual({ ok: true, value: "26048176" });
  });
  test.each([
    ["26-04817-7", "A digit is wrong"],
    ["26-04817", "That is no ticket number"],
    ["nonsense", "That is no ticket number"],
    ["", "That is no ticket number"],
    ["W5724", "That is a badge, no ticket"],
    ["C5724", "That is a carrier, no ticket"],
    ["W5725", "A digit is wrong"],
  ])("refuses %j: %s", (text, why) => {
    const message = expect.stringContaining(why);
    expect(decideTicketNumber(text)).toMatchObject({
      ok: false,
      problem: { code: "invalid", detail: message, errors: [{ path: "code", message }] },
    });
  });
});
