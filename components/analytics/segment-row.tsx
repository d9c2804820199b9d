import { NumberCell } from "@/components/ui/table";
import type { SeamSegment } from "@/lib/analytics/facts";
import { clockText, dayText, hoursAndMinutes } from "@/lib/time/format";
import { localDate } from "@/lib/time/site-day";

/** One stretch of time on a ticket operation: when, where and what. Whose it was is not said here. */
export function SegmentRow({ segment, timeZone }: { segment: SeamSegment; timeZone: string }) {
  const { startMs, endMs, activity, seconds, cell } = segment;
  const end = endMs === null ? "now" : clockText(endMs, timeZone);
  return (
    <tr data-line="" className="text-t-2">
      <td data-book="" colSpan={5} />
      <td data-gauge="" />
      <NumberCell data-day="" data-actual="" data-label="time">
        {seconds === null ? "runs" : hoursAndMinutes(seconds)}
      </NumberCell>
      <td data-day="" colSpan={4}>
        {dayText(localDate(startMs, timeZone), "en-GB")}, {clockText(startMs, timeZone)} to {end}
        <span className="text-ink-2">
          , {activity} in {cell ?? "no cell"}
        </span>
      </td>
    </tr>
  );
}
