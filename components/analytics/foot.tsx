import { StaleNote } from "@/components/ui/stale-note";
import { clockText } from "@/lib/time/format";

/** What the figures are as of, what they leave out, and by which names a standard knows them. */
export function SeamFoot({
  waiting,
  noStandardHours,
  nowMs,
  timeZone,
}: {
  waiting: { marks: number; sinceMs: number | null };
  noStandardHours: string | null;
  nowMs: number;
  timeZone: string;
}) {
  return (
    <footer className="seam-foot">
      <div>
        {waiting.sinceMs === null ? (
          <p>
            Everything booked until {clockText(nowMs, timeZone)} is in; work that runs is not yet.
          </p>
        ) : (
          <StaleNote asOf={clockText(waiting.sinceMs, timeZone)}>
            What was booked since is being summed.
          </StaleNote>
        )}
        {noStandardHours && (
          <p>{noStandardHours} h without a standard are left out of efficiency and drawn dotted.</p>
        )}
      </div>
      <div>
        <p>
          On standard: within 5 %. Efficiency = earned ÷ actual, utilization = direct ÷ attended,
          productivity = earned ÷ attended; the last two are of all time booked.
        </p>
        <p>
          ISO 22400-2 calls utilization <i>worker efficiency</i> (actual personnel work time ÷
          actual personnel attendance time), pieces by time <i>throughput rate</i>, and has{" "}
          <i>rework ratio</i>, <i>scrap ratio</i> and <i>first pass yield</i> for counts.
        </p>
      </div>
    </footer>
  );
}
