import { expect, test } from "vitest";
import { rankOf, rankWords } from "@/lib/ends/urgency";
import { keptCodes, questionCodes } from "@/lib/ledger/schema";

test("every code has one rank with a heading", () => {
  const codes = [...keptCodes, ...questionCodes];
  expect([...rankOf.keys()].toSorted()).toEqual(codes.toSorted());
  expect(new Set(rankOf.values())).toEqual(new Set(rankWords.keys()));
});

test("a record that is not counted is never below a question about one that is", () => {
  expect(keptCodes.map((code) => rankOf.get(code))).toEqual(keptCodes.map(() => 0));
});
