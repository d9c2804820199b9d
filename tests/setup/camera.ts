import { createWriteStream } from "node:fs";
import { finished } from "node:stream/promises";
import bwipjs from "bwip-js/node";

const WIDTH = 640;
const HEIGHT = 480;
const FRAMES_A_SECOND = 10;
const PAPER = 255;
const INK = 0;
const BENCH = 200;

/** What the camera sees and for how long; `nothing` is an empty bench. */
export interface Shot {
  see: "nothing" | { kind: "code128" | "qrcode"; text: string };
  seconds: number;
}

/** One grey picture, row by row. */
type Picture = Uint8Array;

/** Writes what a camera would see as a clip that Chromium plays over and over (YUV4MPEG2). */
export async function writeClip(file: string, shots: readonly Shot[]): Promise<void> {
  const out = createWriteStream(file);
  const colour = new Uint8Array((WIDTH * HEIGHT) / 2).fill(128);
  out.write(`YUV4MPEG2 W${WIDTH} H${HEIGHT} F${FRAMES_A_SECOND}:1 Ip A1:1 C420jpeg\n`);
  for (const { see, seconds } of shots) {
    const picture = pictureOf(see);
    for (let frame = 0; frame < seconds * FRAMES_A_SECOND; frame += 1) {
      out.write("FRAME\n");
      out.write(picture);
      out.write(colour);
    }
  }
  out.end();
  await finished(out);
}

function pictureOf(see: Shot["see"]): Picture {
  const picture = new Uint8Array(WIDTH * HEIGHT).fill(BENCH);
  if (see === "nothing") return picture;
  if (see.kind === "code128") drawBars(picture, see.text);
  else drawSquares(picture, see.text);
  return picture;
}

/** A bar is at least two pixels wide, with ten bars' width of quiet paper at both ends. */
function drawBars(picture: Picture, text: string, unit = 2, height = 160): void {
  const [code] = bwipjs.raw({ bcid: "code128", text });
  const widths = code && "sbs" in code ? code.sbs : [];
  const wide = widths.reduce((total, width) => total + width, 0) * unit;
  const top = (HEIGHT - height) >> 1;
  let left = (WIDTH - wide) >> 1;
  fill(picture, [left - 10 * unit, top - 10, wide + 20 * unit, height + 20], PAPER);
  for (const [at, width] of widths.entries()) {
    if (at % 2 === 0) fill(picture, [left, top, width * unit, height], INK);
    left += width * unit;
  }
}

function drawSquares(picture: Picture, text: string, unit = 8): void {
  const [code] = bwipjs.raw({ bcid: "qrcode", text });
  if (!code || !("pixs" in code)) return;
  const { pixs, pixx, pixy } = code;
  const left = (WIDTH - pixx * unit) >> 1;
  const top = (HEIGHT - pixy * unit) >> 1;
  fill(picture, [left - 4 * unit, top - 4 * unit, (pixx + 8) * unit, (pixy + 8) * unit], PAPER);
  for (const [at, isInk] of pixs.entries()) {
    const square = [left + (at % pixx) * unit, top + Math.floor(at / pixx) * unit, unit, unit];
    if (isInk) fill(picture, square as Box, INK);
  }
}

type Box = [left: number, top: number, width: number, height: number];

function fill(picture: Picture, [left, top, width, height]: Box, grey: number): void {
  for (let row = Math.max(0, top); row < Math.min(HEIGHT, top + height); row += 1) {
    const start = row * WIDTH;
    picture.fill(grey, start + Math.max(0, left), start + Math.min(WIDTH, left + width));
  }
}
