import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { canonicalJson } from "@/lib/ledger/canonical";

describe("canonicalJson", () => {
  test("writes one text however the record was spelled", () => {
    expect(canonicalJson({ b: [1, "x"], a: null })).toBe('{"a":null,"b":[1,"x"]}');
    expect(canonicalJson({ a: null, b: [1, "x"] })).toBe('{"a":null,"b":[1,"x"]}');
  });

  test("for any JSON value the text reads back as that value", () => {
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 5 }), (value) => {
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });

  test("tells records apart that differ in one place only", () => {
    expect(canonicalJson({ a: "1" })).not.toBe(canonicalJson({ a: 1 }));
    expect(canonicalJson([[], 1])).not.toBe(canonicalJson([[1]]));
  });

  test("keeps a record that is nested deeper than any stack", () => {
    const deep = JSON.parse(`${"[".repeat(200_000)}1${"]".repeat(200_000)}`);
    expect(canonicalJson(deep)).toBe(`${"[".repeat(64)}null${"]".repeat(64)}`);
  });

  test("what is no JSON is written as null, so that every record has a text", () => {
    expect(canonicalJson(undefined)).toBe("null");
    expect(canonicalJson(Number.POSITIVE_INFINITY)).toBe("null");
  });
});
