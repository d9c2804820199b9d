import { describe, expect, test } from "vitest";
import { afterSeq, dateField, dateOrNone, line, lineOrNone, sought } from "@/lib/forms";

const said = (parsed: { error?: { issues: { message: string }[] } }) =>
  parsed.error?.issues[0]?.message;

describe("line", () => {
  test("spaces around it go, nothing left is refused in plain words", () => {
    expect(line(10).parse("  Neck 1 ")).toBe("Neck 1");
    expect(said(line(10).safeParse("   "))).toBe("Fill this in.");
    expect(said(line(3).safeParse("Neck"))).toBe("At most 3 characters.");
  });
});

describe("line and lineOrNone", () => {
  test("signs that a database cannot keep are refused, names of any script are not", () => {
    for (const text of ["Il\0o", "Ilo \ud800"]) {
      expect(said(line(10).safeParse(text))).toBe("Leave out the signs that cannot be seen.");
      expect(said(lineOrNone(10).safeParse(text))).toContain("cannot be seen");
    }
    expect(line(10).parse("דנה 🎸")).toBe("דנה 🎸");
  });
});

describe("sought", () => {
  test.each([
    [" Ilo ", "Ilo"],
    ["Il\0o", ""],
    ["12345678901", ""],
    [["a", "b"], ""],
    [undefined, ""],
  ])("of %j looks for %j", (text, found) => expect(sought(10).parse(text)).toBe(found));
});

describe("afterSeq", () => {
  test("reads no number that the database does not have", () => {
    expect(afterSeq.parse("12")).toBe(12);
    for (const text of ["0", "-1", "1.5", "2147483648", "x"])
      expect(afterSeq.safeParse(text).success).toBe(false);
  });
});

describe("lineOrNone", () => {
  test("nothing but spaces is none", () => {
    expect(lineOrNone(10).parse("  ")).toBeNull();
    expect(lineOrNone(10).parse(" P-17 ")).toBe("P-17");
    expect(said(lineOrNone(3).safeParse("P-17"))).toBe("At most 3 characters.");
  });
});

describe("dateField and dateOrNone", () => {
  test("a date that the calendar does not have is refused", () => {
    expect(dateField.parse("2028-02-29")).toBe("2028-02-29");
    expect(said(dateField.safeParse("2026-02-29"))).toBe("Give a date.");
    expect(dateOrNone.parse("")).toBeNull();
    expect(dateOrNone.safeParse("soon").success).toBe(false);
  });
});
