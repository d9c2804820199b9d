import { expect, test } from "vitest";
import { exactLength } from "@/lib/time/exact-length";

test.each([
  [0, "0 min"],
  [9, "9 s"],
  [60, "1 min"],
  [750, "12 min 30 s"],
  [25_500, "7 h 05 min"],
  [3_601, "1 h 00 min 1 s"],
])("exactLength: %i s is %s", (seconds, text) => expect(exactLength(seconds)).toBe(text));
