import type { Stretch } from "@/lib/time/site-day";
import type { PayShift } from "@/lib/timesheet/shifts";

/** A shift as limits see it: as it was tapped, before any rounding. */
export interface ShiftFacts extends Stretch {
  /** The workday for which the shift's start counts. */
  date: string;
  /** Working time: all that is paid. */
  workedSeconds: number;
  /** Rests, meals and time off duty inside the shift, in order. */
  breaks: readonly (Stretch & { kind: "rest" | "meal" | "gap" })[];
}

/** Something that should be looked at; it never blocks. */
export interface Warning {
  code: string;
  /** The workday that it is about. */
  date: string;
  text: string;
}

/** The breaks of a shift, with the gaps between its spans. */
export function breaksOf({ spans }: PayShift): ShiftFacts["breaks"] {
  return spans.flatMap((span, index) => {
    const before = spans[index - 1];
    const gap = before && before.end < span.start ? [before.end] : [];
    return [
      ...gap.map((start) => ({ kind: "gap" as const, start, end: span.start })),
      ...(span.kind === "work" ? [] : [{ kind: span.kind, start: span.start, end: span.end }]),
    ];
  });
}
