import "server-only";
import bwip from "bwip-js/node";
import { assert } from "@/lib/assert";

/** A bar code as widths in modules: bar, gap, bar, …, beginning and ending with a bar. */
export type Bars = readonly number[];

/** A QR code as rows of modules; true is dark. */
export type Dots = readonly (readonly boolean[])[];

/** Encodes a text as Code 128 (ISO/IEC 15417). */
export function barsOf(text: string): Bars {
  const [code] = bwip.raw("code128", text, {});
  assert(code !== undefined && "sbs" in code, "barsOf: Code 128 is made of bars");
  return [...code.sbs];
}

/** Encodes a text as a QR code (ISO/IEC 18004); level Q still reads with a quarter of it lost. */
export function dotsOf(text: string): Dots {
  const [code] = bwip.raw("qrcode", text, "eclevel=Q");
  assert(code !== undefined && "pixs" in code, "dotsOf: a QR code is made of dots");
  const { pixs, pixx, pixy } = code;
  return Array.from({ length: pixy }, (_, y) =>
    Array.from({ length: pixx }, (_, x) => pixs[y * pixx + x] === 1),
  );
}
