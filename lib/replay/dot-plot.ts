/** A dot at the `height`-th place above the floor of its bin. */
interface Dot {
  bin: number;
  height: number;
}

/** Where dots stand and what the scale under them says. */
export interface DotPlot {
  scaleSeconds: number;
  binSeconds: number;
  dots: Dot[];
  /** Pixels from one dot to the next above it: less where a column is high. */
  step: number;
  marks: number[];
}

const BINS = 56;
const ROOM_PX = 76;
const DOT_PX = 10;
const UNITS_MINUTES = [1, 2, 5, 10, 20, 30, 60, 120, 240, 480, 960];

/**
 * Stacks lengths as dots over a scale that begins at nothing and has room for all of them and for
 * the lines that they are held against. Columns too high for the picture are pressed together.
 *
 * @param seconds 0 or more; at least one
 */
export function dotPlot(
  seconds: readonly number[],
  { lines }: { lines: readonly number[] },
): DotPlot {
  const most = Math.max(60, ...seconds, ...lines);
  const scaleSeconds = most * 1.1;
  const binSeconds = scaleSeconds / BINS;
  const counts = new Map<number, number>();
  const dots = [...seconds]
    .sort((a, b) => a - b)
    .map((length) => {
      const bin = Math.floor(length / binSeconds);
      const height = counts.get(bin) ?? 0;
      counts.set(bin, height + 1);
      return { bin, height };
    });
  const highest = Math.max(...counts.values());
  const unit = UNITS_MINUTES.find((minutes) => scaleSeconds / 60 / minutes <= 8) ?? 1920;
  const count = Math.floor(scaleSeconds / 60 / unit);
  return {
    scaleSeconds,
    binSeconds,
    dots,
    step: highest > 1 ? Math.min(DOT_PX, ROOM_PX / (highest - 1)) : DOT_PX,
    marks: Array.from({ length: count + 1 }, (_, place) => place * unit * 60),
  };
}
