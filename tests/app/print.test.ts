import {
  BinaryBitmap,
  HybridBinarizer,
  MultiFormatReader,
  RGBLuminanceSource,
} from "@zxing/library";
import { describe, expect, test } from "vitest";
import { barsOf, dotsOf } from "@/app/_server/print";

const MODULE = 4;
const QUIET = 10;

/** Paints rows of modules on white, as a camera would see the print, and reads what is on it. */
function scan(rows: readonly (readonly boolean[])[]): string {
  const [width, height] = [
    (rows[0]!.length + 2 * QUIET) * MODULE,
    (rows.length + 2 * QUIET) * MODULE,
  ];
  const grey = new Uint8ClampedArray(width * height).fill(255);
  rows.forEach((row, y) => {
    row.forEach((dark, x) => {
      for (let dy = 0; dark && dy < MODULE; dy += 1) {
        const start = ((y + QUIET) * MODULE + dy) * width + (x + QUIET) * MODULE;
        grey.fill(0, start, start + MODULE);
      }
    });
  });
  const source = new RGBLuminanceSource(grey, width, height);
  return new MultiFormatReader().decode(new BinaryBitmap(new HybridBinarizer(source))).getText();
}

describe("barsOf", () => {
  test.each(["T26048176", "W10426", "C00123456789"])("%s reads back from the print", (text) => {
    const line = barsOf(text).flatMap((width, at) => Array(width).fill(at % 2 === 0));
    expect(scan(Array.from({ length: 20 }, () => line))).toBe(text);
  });
});

describe("dotsOf", () => {
  test.each(["T26048176", "https://192.0.2.7:8443/kiosk/enrol?code=K7MR4XPT"])(
    "%s reads back from the print",
    (text) => expect(scan(dotsOf(text))).toBe(text),
  );
});
