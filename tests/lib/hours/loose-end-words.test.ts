import { expect, test } from "vitest";
import { looseEndWords } from "@/lib/hours/loose-end-words";
import { keptCodes, questionCodes } from "@/lib/ledger/schema";

test("looseEndWords has words for every code, and shows an unknown one as it is", () => {
  const codes = [...keptCodes, ...questionCodes];
  expect(codes.filter((code) => looseEndWords(code) === code)).toEqual([]);
  expect(new Set(codes.map(looseEndWords)).size).toBe(codes.length);
  expect(looseEndWords("later-code")).toBe("later-code");
});
