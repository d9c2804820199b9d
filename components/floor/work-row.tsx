import { type Forgotten, PersonName } from "@/components/floor/person-name";
import { SeamGauge } from "@/components/seam/gauge";
import { VerdictTag } from "@/components/seam/verdict-tag";
import { TicketLink } from "@/components/tickets/ticket-link";
import { NumberCell } from "@/components/ui/table";
import { actualSeconds } from "@/lib/floor/actual";
import type { FloorWork } from "@/lib/floor/schema";
import { standardMinutes } from "@/lib/seam/verdict";
import { clockText } from "@/lib/time/format";

/** A ticket operation that someone is on: its standard, its time, and who is on it since when. */
export function WorkRow({
  work,
  now,
  scaleSeconds,
  timeZone,
  linksTickets,
  forgotten,
}: {
  work: FloorWork;
  now: number;
  scaleSeconds: number;
  timeZone: string;
  linksTickets: boolean;
  forgotten: Forgotten | null;
}) {
  const { standardSeconds } = work;
  const pair = { standardSeconds, actualSeconds: actualSeconds(work, now) };
  const rework = work.people.every(({ activity }) => activity === "rework");
  return (
    <tr>
      <td data-book="" className="desk-wrap" title={work.options.join(", ") || undefined}>
        <span className="font-[650]">{work.name}</span>{" "}
        <span className="text-ink-2">{work.model}</span>
      </td>
      <td data-book="">
        <TicketLink number={work.ticket} links={linksTickets} />
      </td>
      <NumberCell data-book="" data-standard="" data-label="std min">
        {standardSeconds === null ? (
          <span className="font-medium text-ink-2">none</span>
        ) : (
          standardMinutes(standardSeconds)
        )}
      </NumberCell>
      <td data-gauge="">
        <SeamGauge
          {...pair}
          flush
          state="live"
          rework={rework}
          scaleSeconds={scaleSeconds}
          name={work.name}
        />
      </td>
      <td data-day="">
        <VerdictTag pair={pair} finished={false} />
      </td>
      <td data-day="" className="desk-tall">
        {work.people.map(({ worker, name, since, activity, weights }) => (
          <span key={worker} className="block">
            <PersonName
              person={{ worker, name }}
              deed="shift-end"
              proposedSecond={now}
              timeZone={timeZone}
              forgotten={forgotten}
            />
            <span className="text-ink-2">
              {activity === "run" ? "" : `, ${activity}`}
              {weights.length > 1 ? `, on ${weights.length} tickets` : ""}, since{" "}
              {clockText(since * 1000, timeZone)}
            </span>
          </span>
        ))}
      </td>
    </tr>
  );
}
