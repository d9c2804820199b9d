import { describe, expect, test } from "vitest";
import { agreeForm, spelledDay } from "@/lib/agreement/schema";
import { eventId } from "@/tests/make/events";

const day = { worker: "1042", date: "2026-05-11", digest: "a".repeat(64) };

describe("spelledDay", () => {
  test("is read back by the form", () => {
    const form = { id: eventId(1), days: [spelledDay(day)] };
    expect(agreeForm.parse(form).days).toEqual([day]);
  });
  test.each([[[]], [["1042 2026-05-11"]], [["x 2026-05-11 ".concat("a".repeat(64))]]])(
    "the form refuses %j",
    (days) => expect(agreeForm.safeParse({ id: eventId(1), days }).success).toBe(false),
  );
});
