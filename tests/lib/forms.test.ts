import { describe, expect, test } from "vitest";
import { dateField, dateOrNone, line, lineOrNone } from "@/lib/forms";

const said = (parsed: { error?: { issues: { message: string }[] } }) =>
  parsed.error?.issues[0]?.message;

describe("line", () => {
  test("spaces around it go, nothing left is refused in plain words", () => {
    expect(line(10).parse("  Neck 1 ")).toBe("Neck 1");
    expect(said(line(10).safeParse("   "))).toBe("Fill this in.");
    expect(said(line(3).safeParse("Neck"))).toBe("At most 3 characters.");
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
