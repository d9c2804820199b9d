import { TicketLink } from "@/components/tickets/ticket-link";
import { Icon } from "@/components/ui/icon";
import { headCount, type Overrun, overruns } from "@/lib/floor/actual";
import type { FloorView } from "@/lib/floor/schema";
import { clockText } from "@/lib/time/format";

const OVERRUNS_SHOWN = 3;

/** The floor in figures at the seam: who is on tickets, and what is over its standard. */
export function FloorHead({
  floor,
  nowMs,
  linksTickets,
}: {
  floor: FloorView;
  nowMs: number;
  linksTickets: boolean;
}) {
  const count = headCount(floor);
  const over = overruns(floor, Math.floor(nowMs / 1000));
  const others = [
    [count.onOtherWork, "on other work"],
    [count.onBreak, "on a break"],
    [count.onNothing, "on nothing yet"],
    [count.missing, "planned, not in"],
  ].filter(([many]) => many !== 0);
  return (
    <header className="desk-figures">
      <div>
        <h1 className="sr-only">Floor</h1>
        <p className="desk-aside text-ink-2">
          {others.map(([many, words]) => (
            <span key={words} className="block">
              {many} {words}
            </span>
          ))}
        </p>
        <p className="desk-figure">
          <span className="text-standard-ink">
            on
            <br /> tickets
          </span>
          <b>{count.onTickets}</b>
        </p>
      </div>
      <div>
        <p className={`desk-figure ${over.length > 0 ? "text-over" : "text-ink-2"}`}>
          <b>{over.length}</b>
          <span>
            <span className="tag">over {over.length > 0 && <Icon name="over" />}</span>
            <br /> standard
          </span>
        </p>
        <OverrunList over={over} linksTickets={linksTickets} />
        <p className="desk-clock">{clockText(nowMs, floor.timeZone)}</p>
      </div>
    </header>
  );
}

/** Names cell, operation and ticket: an overrun is a fact about time, not about a person. */
function OverrunList({ over, linksTickets }: { over: Overrun[]; linksTickets: boolean }) {
  const more = over.length - OVERRUNS_SHOWN;
  return (
    <ul className="desk-aside" data-spare="">
      {over.slice(0, OVERRUNS_SHOWN).map(({ cell, ticket, operation, name, overMinutes }) => (
        <li key={`${operation} ${ticket}`}>
          <span className="text-ink-2">{cell}</span> {name}{" "}
          <TicketLink number={ticket} links={linksTickets} />{" "}
          <span className="font-[650] text-over">{overMinutes} over</span>
        </li>
      ))}
      {more > 0 && <li className="text-ink-2">and {more} more below</li>}
    </ul>
  );
}
