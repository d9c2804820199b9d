import type { KioskState } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import { type Stretch, type StripSpan, stripSpan } from "@/lib/seam/day-strip";
import { hoursAndMinutes } from "@/lib/time/format";
import type { Segment } from "@/lib/timeline/schema";

/** A worker's day as its strip shows it. */
export interface DayPicture {
  stretches: Stretch[];
  span: StripSpan;
  planned: StripSpan | null;
  nowAt: number;
}

/** Turns the day's segments into stretches of clock time; what runs ends now. */
export function dayStretches(state: KioskState, view: BenchView): DayPicture {
  const nowAt = Math.floor(state.nowMs / 1000);
  const stretches = view.segments.map((segment) => ({
    start: segment.start,
    end: Math.max(segment.start + 1, segment.end ?? nowAt),
    kind: kindOf(segment),
  }));
  const planned = view.planned && { from: view.planned.start, to: view.planned.end };
  const span = planned ? stripSpan(stretches, planned) : stripSpan(stretches);
  return { stretches, span, planned, nowAt };
}

function kindOf({ doing }: Segment): Stretch["kind"] {
  if (doing.kind === "work") return doing.activity === "rework" ? "rework" : "work";
  return doing.kind === "indirect" ? "other-work" : doing.kind;
}

/** How long the worker has attended today: "2 h 48 min". */
export function todayText(view: BenchView): string {
  return hoursAndMinutes(view.today.attendanceSeconds);
}
