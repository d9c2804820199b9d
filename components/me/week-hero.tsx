import Link from "next/link";
import { plannedWords } from "@/components/me/planned-words";
import { SeamGauge } from "@/components/seam/gauge";
import type { OwnSums, OwnWeek } from "@/lib/me/own-week";
import { seamScale } from "@/lib/seam/scale";
import { decimalHour } from "@/lib/time/format";

/** The week so far: planned on the left, tapped on the right; beneath them what is paid. */
export function WeekHero({ week: { week, period } }: { week: OwnWeek }) {
  const pair = { standardSeconds: week.plannedSeconds, actualSeconds: week.tappedSeconds };
  return (
    <section aria-label="The week" className="me-hero">
      <div className="me-pair me-totals">
        <p>
          <span className="text-standard">planned{week.isNow ? " so far" : ""}</span>
          <b>{decimalHour(week.plannedSeconds)}</b>
        </p>
        <p>
          <span className="text-actual">tapped, {week.label}</span>
          <b className="text-actual">{decimalHour(week.tappedSeconds)}</b>
        </p>
      </div>
      <SeamGauge
        {...pair}
        size="phone"
        flush
        state={week.isNow ? "live" : "finished"}
        words={plannedWords}
        scaleSeconds={seamScale([pair])}
        name="The week, planned and tapped"
      />
      <Figures label="this week" sums={week} />
      {period && (
        <Figures
          label={`pay period ${period.label}${period.isClosed ? ", closed" : ""}`}
          sums={period}
        />
      )}
      <nav aria-label="Weeks" className="me-pair me-weeks">
        <p>
          <Link href={`/me?week=${week.before}`}>the week before</Link>
        </p>
        <p>{week.after && <Link href={`/me?week=${week.after}`}>the week after</Link>}</p>
      </nav>
    </section>
  );
}

/** Tapped and paid hours side by side; the rule that parts them stands with each day. */
function Figures({ label, sums }: { label: string; sums: OwnSums }) {
  return (
    <div className="me-figures">
      <p className="me-over-seam">{label}</p>
      <p>
        tapped <b>{decimalHour(sums.tappedSeconds)}</b>
      </p>
      <p>
        <b>{decimalHour(sums.paidSeconds)}</b> paid
      </p>
    </div>
  );
}
