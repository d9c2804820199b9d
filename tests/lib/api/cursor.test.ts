import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { cursor, cursorOf } from "@/lib/api/cursor";

const position = z.object({ day: z.iso.date(), seq: z.number().int() });
const schema = cursor(position);
const message = "Take the cursor from `nextCursor`, or leave it out for the first page.";

describe("cursorOf and cursor", () => {
  test("for any position, reading gives it back, and it fits a URL as it is", () => {
    const positions = fc.record({ name: fc.string({ unit: "binary" }), seq: fc.integer() });
    const any = cursor(z.object({ name: z.string(), seq: z.number() }));
    fc.assert(
      fc.property(positions, (at) => {
        const text = cursorOf(at);
        expect(text).toMatch(/^[\w-]+$/);
        if (text.length <= 512) expect(any.parse(text)).toEqual(JSON.parse(JSON.stringify(at)));
      }),
    );
  });
  test.each([
    ["nothing", ""],
    ["no base64", "%%%"],
    ["no UTF-8", "_w"],
    ["no JSON", btoa("{day")],
    ["another list's", cursorOf({ seq: 1 })],
    ["a position that cannot be", cursorOf({ day: "2026-02-30", seq: 1 })],
    ["one cut short", cursorOf({ day: "2026-02-03", seq: 1 }).slice(0, -4)],
  ])("refuses %s", (_, text) => {
    expect(schema.safeParse(text).error?.issues.map((issue) => issue.message)).toEqual([message]);
  });
  test("refuses a long one unread", () => {
    expect(schema.safeParse("A".repeat(513)).success).toBe(false);
  });
});
