import { hourMarks } from "@/lib/hours/day-spans";
import type { StripSpan } from "@/lib/seam/day-strip";
import { clockText } from "@/lib/time/format";

/** The hours under a day's strip, on the site's clock. */
export function StripHours({ span, timeZone }: { span: StripSpan; timeZone: string }) {
  return (
    <span aria-hidden className="hours-marks">
      {hourMarks(span).map((mark) => (
        <span key={mark} style={{ left: `${((mark - span.from) / (span.to - span.from)) * 100}%` }}>
          {clockText(mark * 1000, timeZone).slice(0, 2)}
        </span>
      ))}
    </span>
  );
}
