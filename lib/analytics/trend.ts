/** A drawing of efficiency by week, in its own units; y grows downwards. */
export interface TrendDrawing {
  /** One polyline for each run of weeks in which something was done. */
  lines: { x: number; y: number }[][];
  /** Where 100 % lies. */
  targetY: number;
  last: { x: number; y: number } | null;
}

/** The target: earned is actual. */
const TARGET = 1;
/** A trend that hardly moves is not blown up to look wild: the scale spans at least this. */
const LEAST_SPAN = 0.2;

/**
 * Draws a trend on a scale of its own that always holds the target, so that a drift can be seen.
 * Weeks without work are gaps. Nothing at all: no line, the target in the middle.
 *
 * @param values by week, the oldest first; null where nothing was done
 */
export function drawTrend(
  values: readonly (number | null)[],
  { width, height }: { width: number; height: number },
): TrendDrawing {
  const known = values.filter((value) => value !== null);
  const [low, high] = [Math.min(TARGET, ...known), Math.max(TARGET, ...known)];
  const span = Math.max(LEAST_SPAN, high - low);
  const top = (low + high + span) / 2;
  const yOf = (value: number) => ((top - value) / span) * height;
  const step = width / Math.max(1, values.length - 1);
  const lines: { x: number; y: number }[][] = [];
  let isRun = false;
  values.forEach((value, week) => {
    if (value === null) {
      isRun = false;
      return;
    }
    const point = { x: week * step, y: yOf(value) };
    if (isRun) lines.at(-1)!.push(point);
    else lines.push([point]);
    isRun = true;
  });
  return { lines, targetY: yOf(TARGET), last: lines.at(-1)?.at(-1) ?? null };
}
