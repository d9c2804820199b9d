import { describe, expect, test } from "vitest";
import { cautionOf, cautionVersion } from "@/lib/bench/cautions";

const words = (lines: readonly { words: string }[]) => lines.map((line) => line.words);

describe("cautionOf", () => {
  test("spraying warns of fire and explosion and asks for all three", () => {
    const { warns, wears } = cautionOf(["spray"]);
    expect(words(warns)).toEqual(["lacquerBurns", "vapourExplodes"]);
    expect(words(wears)).toEqual(["respirator", "goggles", "nitrileGloves"]);
  });

  test("says once what several hazards ask for", () => {
    expect(words(cautionOf(["spray", "solvent", "dust"]).wears)).toEqual([
      "respirator",
      "goggles",
      "nitrileGloves",
      "dustMask",
    ]);
  });

  test("rollers and gloves do not go together", () => {
    expect(cautionOf(["rollers"]).wears.map(({ sign }) => sign)).toContain("p-gloves");
  });

  test("a hazard that has no words here is still a hazard", () => {
    expect(words(cautionOf(["lasers"]).warns)).toEqual(["generalHazard"]);
    expect(cautionOf([])).toEqual({ warns: [], wears: [] });
  });
});

describe("cautionVersion", () => {
  test("is the same whatever the order, and another when a hazard is added", () => {
    expect(cautionVersion(["spray", "dust"])).toBe(cautionVersion(["dust", "spray"]));
    expect(cautionVersion(["spray", "dust"])).not.toBe(cautionVersion(["spray"]));
  });

  test("fits the ledger's field", () => {
    expect(cautionVersion(Array(40).fill("hazard")).length).toBeLessThanOrEqual(64);
  });
});
