import { type Stretch, type StripSpan, stripSpan } from "@/lib/seam/day-strip";

/** A day whose strip stands among others: when it begins, and what is drawn of it. */
export interface StripDay {
  /** epoch second at which the production day begins */
  start: number;
  stretches: readonly Stretch[];
  planned: StripSpan | null;
}

/**
 * The span that each day's strip shows, so that strips under each other compare: all begin and end
 * at the same hours of their day, those around all that happened or was planned on any of them.
 *
 * @returns one span for each day, in their order, all equally long
 */
export function daySpans(days: readonly StripDay[]): StripSpan[] {
  const drawn = days
    .filter(({ stretches, planned }) => stretches.length > 0 || planned)
    .map(({ start, stretches, planned }) => {
      const { from, to } = stripSpan(stretches, planned ?? undefined);
      return { from: from - start, to: to - start };
    });
  const from = Math.min(...drawn.map((span) => span.from));
  const to = Math.max(...drawn.map((span) => span.to));
  if (drawn.length === 0) return days.map(({ start }) => ({ from: start, to: start + 3600 }));
  return days.map(({ start }) => ({ from: start + from, to: start + to }));
}

/** Marks for the hours under a strip that is opened: every second one, or every fourth of a long day. */
export function hourMarks({ from, to }: StripSpan): number[] {
  const step = to - from > 14 * 3600 ? 4 * 3600 : 2 * 3600;
  const marks: number[] = [];
  for (let mark = from; mark <= to; mark += step) marks.push(mark);
  return marks;
}
