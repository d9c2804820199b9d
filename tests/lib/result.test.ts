import { describe, expect, test } from "vitest";
import { no, ok } from "@/lib/result";

describe("ok", () => {
  test("is a yes with its value, also when that is nothing", () => {
    expect(ok(3)).toEqual({ ok: true, value: 3 });
    expect(ok(null)).toEqual({ ok: true, value: null });
  });
});

describe("no", () => {
  test("is a no with its reason and what else there is to say", () => {
    const errors = [{ path: "good", message: "not below 0" }];
    expect(no("invalid", "Check good.", { errors })).toEqual({
      ok: false,
      problem: { code: "invalid", detail: "Check good.", errors },
    });
  });
  test("says nothing of errors or waiting where there are none", () => {
    expect(Object.keys(no("gone", "No longer kept.").problem)).toEqual(["code", "detail"]);
  });
});
