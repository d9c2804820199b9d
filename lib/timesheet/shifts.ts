import type { Stretch } from "@/lib/time/site-day";

/** What a worker attended, in epoch seconds; a work span may carry its rate per hour. */
export interface Span extends Stretch {
  kind: "work" | "rest" | "meal";
  /** A decimal text; null where none is given. */
  rate: string | null;
}

/** Spans between two gaps that are long enough to part shifts. */
export interface PayShift extends Stretch {
  /** In order, without overlap; gaps between them are time off duty. */
  spans: readonly Span[];
}

/**
 * Puts spans in order, drops those of no length, joins breaks of one kind that touch (a rest in two
 * spans is one rest), and gives breaks without a rate that of the work before, else after.
 *
 * @param spans in any order, without overlap
 */
export function tidySpans(spans: readonly Span[]): Span[] {
  const inOrder = spans
    .filter(({ start, end }) => end > start)
    .toSorted((a, b) => a.start - b.start);
  return withRates(joinBreaks(inOrder));
}

/** Parts spans into shifts: a gap of at least `newShiftAfterMinutes` lies between two. */
export function shiftsOf(spans: readonly Span[], newShiftAfterMinutes: number): PayShift[] {
  const groups: Span[][] = [];
  for (const span of spans) {
    const before = groups.at(-1);
    const gap = span.start - (before?.at(-1)?.end ?? Number.NEGATIVE_INFINITY);
    if (before && gap < newShiftAfterMinutes * 60) before.push(span);
    else groups.push([span]);
  }
  return groups.map((group) => ({ start: group[0]!.start, end: group.at(-1)!.end, spans: group }));
}

function joinBreaks(spans: readonly Span[]): Span[] {
  const joined: Span[] = [];
  for (const span of spans) {
    const last = joined.at(-1);
    const touches = last && span.kind !== "work" && last.kind === span.kind;
    if (touches && last.end === span.start && last.rate === span.rate) {
      joined[joined.length - 1] = { ...last, end: span.end };
    } else joined.push(span);
  }
  return joined;
}

function withRates(spans: readonly Span[]): Span[] {
  let near = spans.find(({ kind, rate }) => kind === "work" && rate !== null)?.rate ?? null;
  return spans.map((span) => {
    if (span.kind === "work") near = span.rate ?? near;
    return { ...span, rate: span.rate ?? near };
  });
}
