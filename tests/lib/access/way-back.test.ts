import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { signInFor, wayBack } from "@/lib/access/way-back";

describe("wayBack", () => {
  test.each([
    ["/hours", "/hours"],
    ["/hours?worker=1003&day=2026-05-14", "/hours?worker=1003&day=2026-05-14"],
    ["/tickets/26-04817-6?open=010", "/tickets/26-04817-6?open=010"],
    ["/tickets?_rsc=1abc&q=48", "/tickets?q=48"],
    ["/people#rim", "/people"],
    ["/floor/../hours", "/hours"],
  ])("goes on from %s to %s", (asked, path) => expect(wayBack(asked)).toBe(path));

  test.each([
    [""],
    ["hours"],
    ["//elsewhere.example"],
    ["///elsewhere.example"],
    ["/\\elsewhere.example"],
    ["/\t/elsewhere.example"],
    ["/.//elsewhere.example"],
    ["/hours/..//elsewhere.example"],
    ["https://elsewhere.example/hours"],
    ["javascript:alert(1)"],
    ["/sign-in"],
    ["/sign-in?to=/hours"],
    ["/api/floor"],
    [`/${"a".repeat(1000)}`],
  ])("begins at the start where %s was asked for", (asked) => expect(wayBack(asked)).toBe("/"));

  test("for any text, what comes back stays on the site and comes back the same again", () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.webUrl(), fc.webPath()), (asked) => {
        const path = wayBack(asked);
        expect(new URL(path, "https://bookmatch.example").origin).toBe("https://bookmatch.example");
        expect(wayBack(path)).toBe(path);
      }),
    );
  });
});

describe("signInFor", () => {
  test("carries the page asked for, and nothing for the start", () => {
    expect(signInFor("/hours?cell=Final set-up")).toBe(
      "/sign-in?to=%2Fhours%3Fcell%3DFinal%2Bset-up",
    );
    expect(signInFor("/")).toBe("/sign-in");
    expect(signInFor("//elsewhere.example")).toBe("/sign-in");
  });
});
