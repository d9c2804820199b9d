import type { SeamTotals } from "@/lib/analytics/lines";
import { type Basis, timedSeconds } from "@/lib/analytics/sums";
import { countOf, finePercentOf, hoursOf } from "@/lib/analytics/words";

/** The sums of the page about the seam: earned on the left, actual on the right. */
export function SeamFigures({ totals, basis }: { totals: SeamTotals; basis: Basis }) {
  const work = totals[basis];
  return (
    <div className="desk-figures seam-figures">
      <div>
        <p className="desk-aside seam-aside">
          <b>{countOf(work.pieces)}</b>
          <br />
          {basis === "matched" ? "pieces through" : "pieces counted"}
        </p>
        <p className="desk-aside seam-aside">
          <b>{hoursOf(totals.attendanceSeconds)}</b>
          <br />
          hours attended
          <br />
          of it {hoursOf(totals.indirectSeconds)} indirect
        </p>
        <p className="desk-figure text-standard-ink">
          <span>
            earned
            <br /> hours
          </span>
          <b>{hoursOf(work.earnedSeconds)}</b>
        </p>
      </div>
      <div>
        <p className="desk-figure text-actual">
          <b>{hoursOf(timedSeconds(work))}</b>
          <span>
            actual
            <br /> hours
          </span>
        </p>
        <Ratio name="efficiency" of="earned ÷ actual" value={totals.efficiency} />
        <Ratio name="utilization" of="direct ÷ attended" value={totals.utilization} />
        <Ratio name="productivity" of="earned ÷ attended" value={totals.productivity} />
      </div>
    </div>
  );
}

function Ratio({ name, of, value }: { name: string; of: string; value: number | null }) {
  return (
    <p className="desk-aside seam-aside">
      <b>{finePercentOf(value)}</b>
      <br />
      {name}
      <br />
      <span className="text-ink-2">{of}</span>
    </p>
  );
}
