import type { HoursPageView } from "@/lib/hours/page";
import { groupedHours as grouped, roundedHundredths, shareHundredths } from "@/lib/time/format";

/** The sums of the page about the seam: planned on the left, present and attended on the right. */
export function HoursFigures({
  total,
  isWhole,
}: {
  total: HoursPageView["total"];
  /** False where the list goes on: the sums are of this page. */
  isWhole: boolean;
}) {
  const attended = roundedHundredths(total.attendanceSeconds);
  const parts = [
    total.directSeconds,
    total.indirectSeconds,
    total.restSeconds,
    total.unassignedSeconds,
  ];
  const [direct, indirect, rest, unassigned] = shareHundredths(attended, parts).map(grouped);
  return (
    <div className="desk-figures">
      <div>
        <p className="desk-aside">
          <b>{total.people}</b> {total.people === 1 ? "person" : "people"}
          {isWhole ? "" : " on this page"}
        </p>
        <p className="desk-figure text-standard-ink">
          <span>
            planned
            <br /> hours
          </span>
          <b>{grouped(roundedHundredths(total.plannedSeconds))}</b>
        </p>
      </div>
      <div>
        <p className="desk-figure text-actual">
          <b>{grouped(roundedHundredths(total.spanSeconds))}</b>
          <span>
            present
            <br /> hours
          </span>
        </p>
        <p className="desk-aside">
          <b>{grouped(attended)} attended</b>
          <br />
          {direct} direct + {indirect} indirect + {rest} rest + {unassigned} unassigned
        </p>
      </div>
    </div>
  );
}
