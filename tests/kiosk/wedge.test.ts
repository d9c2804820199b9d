import { describe, expect, test } from "vitest";
import { makeWedgeReader } from "@/kiosk/wedge";

function type(text: string, everyMs: number) {
  const reader = makeWedgeReader();
  const given = [...text, "Enter"].map((key, place) =>
    reader.press({ key, atMs: 1000 + place * everyMs }),
  );
  return given.filter((whole) => whole !== null);
}

describe("makeWedgeReader", () => {
  test("gives the text of a fast burst that ends in Enter", () => {
    expect(type("T26048176", 8)).toEqual(["T26048176"]);
  });

  test("leaves a person's key presses alone", () => {
    expect(type("26048176", 120)).toEqual([]);
  });

  test("keys that come before a burst are no part of it", () => {
    const reader = makeWedgeReader();
    reader.press({ key: "9", atMs: 0 });
    for (const [place, key] of [..."W10427"].entries()) {
      reader.press({ key, atMs: 1000 + place * 5 });
    }
    expect(reader.press({ key: "Enter", atMs: 1035 })).toBe("W10427");
  });

  test("Shift and other named keys add nothing", () => {
    const reader = makeWedgeReader();
    for (const [place, key] of ["Shift", "W", "1", "0", "4", "2", "7"].entries()) {
      reader.press({ key, atMs: place * 5 });
    }
    expect(reader.press({ key: "Enter", atMs: 40 })).toBe("W10427");
  });
});
