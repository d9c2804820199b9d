import Link from "next/link";
import { plannedWords } from "@/components/me/planned-words";
import { SeamGauge } from "@/components/seam/gauge";
import { Icon } from "@/components/ui/icon";
import type { MeDay } from "@/lib/me/view";
import { decimalHour, decimalHours } from "@/lib/time/format";

/** The days of the week on one scale; the open one with its work and why it is paid as it is. */
export function DayList({
  days,
  open,
  week,
  scaleSeconds,
}: {
  days: readonly MeDay[];
  /** The date that is open; where none is, today. */
  open: string;
  week: string;
  scaleSeconds: number;
}) {
  const tapped = decimalHours(days.map(({ tappedSeconds }) => tappedSeconds ?? 0)).parts;
  const isOpen = (day: MeDay) => (open ? day.date === open : day.isToday);
  return (
    <ol className="me-days">
      {days.map((day, place) => (
        <li key={day.date} data-open={isOpen(day) ? "" : undefined}>
          <h2 className="me-pair">
            <span>
              <Link href={`/me?week=${week}&day=${day.date}`} scroll={false}>
                {day.isToday ? "Today" : day.label}
              </Link>
              {day.plannedSeconds !== null && (
                <span className="text-standard">{decimalHour(day.plannedSeconds)}</span>
              )}
            </span>
            <span>
              {day.tappedSeconds !== null && <b className="text-actual">{tapped[place]}</b>}
              <span className="text-ink-2">{day.span}</span>
            </span>
          </h2>
          {(day.plannedSeconds ?? day.tappedSeconds) !== null && (
            <SeamGauge
              standardSeconds={day.plannedSeconds}
              actualSeconds={day.tappedSeconds ?? 0}
              size="row"
              flush
              state={day.runs || day.tappedSeconds === null ? "live" : "finished"}
              words={plannedWords}
              scaleSeconds={scaleSeconds}
              name={`${day.label}, planned and tapped`}
            />
          )}
          {isOpen(day) && <DayOpen day={day} />}
        </li>
      ))}
    </ol>
  );
}

function DayOpen({ day }: { day: MeDay }) {
  const { work, trail, paidSeconds, tappedSeconds } = day;
  return (
    <div className="me-open">
      {work.map(({ key, what, ticket, seconds }) => (
        <p key={key} className="me-pair">
          <span>
            {what} {ticket && <span className="code">{ticket}</span>}
          </span>
          <span>{Math.floor(seconds / 60)} min</span>
        </p>
      ))}
      {tappedSeconds !== null && (
        <p className="me-pair">
          <span>paid</span>
          <b>{decimalHour(paidSeconds)}</b>
        </p>
      )}
      {trail.length > 0 && (
        <ul className="me-trail">
          {trail.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      )}
      <Signatures day={day} />
    </div>
  );
}

function Signatures({ day: { isSigned, isSignedByLead, hasLapsed } }: { day: MeDay }) {
  return (
    <p className="me-signed">
      {isSigned && (
        <span className="tag text-actual">
          <Icon name="good" /> you agreed
        </span>
      )}
      {isSignedByLead && (
        <span className="tag text-actual">
          <Icon name="good" /> the lead agreed
        </span>
      )}
      {hasLapsed && <span className="text-ink-2">The day was changed after it was agreed to.</span>}
    </p>
  );
}
