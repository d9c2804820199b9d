import { expect, test } from "vitest";
import { otherWorkWords } from "@/lib/ledger/other-work-words";

test("otherWorkWords says any code, also one that a site made itself", () => {
  expect(otherWorkWords("machine-down")).toBe("machine down");
  expect(otherWorkWords("inventory")).toBe("inventory");
  expect(otherWorkWords(null)).toBe("other work");
});
