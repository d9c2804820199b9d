/** What a stretch of a day was: `loose` is time that a person must settle. */
type StretchKind = "work" | "rework" | "other-work" | "rest" | "meal" | "unassigned" | "loose";

/** A stretch of a day, `[start, end)` in epoch seconds. */
export interface Stretch {
  start: number;
  end: number;
  kind: StretchKind;
}

/** A stretch on the strip, its place in percent of the width. */
export interface PlacedStretch {
  kind: StretchKind;
  left: number;
  width: number;
}

/** The clock times that a strip spans, in epoch seconds. */
export interface StripSpan {
  from: number;
  to: number;
}

/** Under this share of the strip a stretch could not be seen. */
const LEAST_PERCENT = 0.3;

/**
 * Places the stretches of a day on its strip, in the order given. What lies outside the span is
 * cut off, what is too short to see is drawn at its least width. A strip shows clock time, so it
 * is never mirrored.
 */
export function placeStretches(
  stretches: readonly Stretch[],
  { from, to }: StripSpan,
): PlacedStretch[] {
  const percentOf = (instant: number) =>
    ((Math.min(to, Math.max(from, instant)) - from) / (to - from)) * 100;
  return stretches
    .filter(({ start, end }) => start < to && end > from)
    .map(({ start, end, kind }) => {
      const left = percentOf(start);
      return { kind, left, width: Math.max(LEAST_PERCENT, percentOf(end) - left) };
    });
}

const HOUR = 3600;

/**
 * Answers which span shows a day: its planned hours, widened to the whole hours around all that
 * happened. Hours are of the epoch, so a site half an hour off has its marks at half past.
 */
export function stripSpan(stretches: readonly Stretch[], planned?: StripSpan): StripSpan {
  const starts = [...stretches.map(({ start }) => start), ...(planned ? [planned.from] : [])];
  const ends = [...stretches.map(({ end }) => end), ...(planned ? [planned.to] : [])];
  if (starts.length === 0) return { from: 0, to: HOUR };
  const from = Math.floor(Math.min(...starts) / HOUR) * HOUR;
  return { from, to: Math.max(from + HOUR, Math.ceil(Math.max(...ends) / HOUR) * HOUR) };
}
