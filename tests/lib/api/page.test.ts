import { describe, expect, test } from "vitest";
import { cursorOf } from "@/lib/api/cursor";
import { pageLimit, pageOf } from "@/lib/api/page";

describe("pageOf", () => {
  const seqOf = (row: { seq: number }) => row.seq;
  const rows = [{ seq: 3 }, { seq: 5 }, { seq: 8 }];
  test("a row too many makes a next page, which starts after the last row kept", () => {
    expect(pageOf(rows, 2, seqOf)).toEqual({ items: rows.slice(0, 2), nextCursor: cursorOf(5) });
  });
  test("a full page without a row too many is the last", () => {
    expect(pageOf(rows, 3, seqOf)).toEqual({ items: rows, nextCursor: null });
    expect(pageOf([], 3, seqOf)).toEqual({ items: [], nextCursor: null });
  });
});

describe("pageLimit", () => {
  test.each([
    [undefined, 100],
    ["1", 1],
    ["500", 500],
  ])("%j is %i rows", (text, limit) => expect(pageLimit.parse(text)).toBe(limit));
  test.each(["0", "501", "-1", "1.5", "many", ""])("refuses %j", (text) => {
    expect(pageLimit.safeParse(text).success).toBe(false);
  });
});
