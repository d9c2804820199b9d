import { expect, test } from "vitest";
import { acceptWords, endWords } from "@/lib/ends/words";
import { keptCodes, questionCodes } from "@/lib/ledger/schema";

test("every code has its words, each its own, and none a blame or a mark of exclamation", () => {
  const words = [...keptCodes, ...questionCodes].map((code) => endWords[code]);
  expect(new Set(words).size).toBe(words.length);
  expect(words.filter((text) => /invalid|failed|error|wrong time|!/i.test(text))).toEqual([]);
});

test("what does not count cannot be left as it is", () => {
  expect(keptCodes.filter((code) => acceptWords[code])).toEqual([]);
});
