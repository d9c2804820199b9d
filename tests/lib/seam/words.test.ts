import { describe, expect, test } from "vitest";
import { englishSeamWords, seamFigures, seamWord } from "@/lib/seam/words";

describe("seamWord", () => {
  test.each([
    ["over", 14, "14 over"],
    ["left", 17, "17 min left"],
    ["under", 4, "4 under"],
    ["on-standard", 1, "on standard"],
    ["no-standard", 22, "no standard"],
  ] as const)("says %s of %d minutes as “%s”", (word, minutes, said) => {
    expect(seamWord({ word, minutes })).toBe(said);
  });

  test("speaks another language where it is given", () => {
    const words = { ...englishSeamWords, over: (minutes: number) => `${minutes} de más` };
    expect(seamWord({ word: "over", minutes: 12 }, words)).toBe("12 de más");
  });
});

describe("seamFigures", () => {
  test("speaks standard and actual", () => {
    expect(seamFigures({ standardSeconds: 2880, actualSeconds: 1899 })).toBe(
      "48 min standard, 31 min actual",
    );
  });
  test("speaks the actual alone where there is no standard", () => {
    expect(seamFigures({ standardSeconds: null, actualSeconds: 1320 })).toBe("22 min actual");
  });
});
