import Link from "next/link";
import { Fragment } from "react";
import { SaveLink } from "@/components/analytics/filter-sentence";
import { LineRow } from "@/components/analytics/line-row";
import { LineOpener } from "@/components/analytics/opener";
import { SegmentRow } from "@/components/analytics/segment-row";
import { TicketLink } from "@/components/tickets/ticket-link";
import { type Opening, openings, type SeamFilter, seamAddress } from "@/lib/analytics/filter";
import { loupeOf, type Opened } from "@/lib/analytics/opened";
import { seamScale } from "@/lib/seam/scale";
import { dayText } from "@/lib/time/format";

const words: Record<Opening, string> = {
  model: "by model",
  options: "by option",
  week: "by week",
  ticket: "by ticket",
};
const without: Record<Opening, string> = {
  model: "a ticket that nobody knows",
  options: "no options",
  week: "",
  ticket: "",
};

interface OpenedProps {
  opened: Opened;
  filter: SeamFilter;
  columns: number;
  scaleSeconds: number;
  timeZone: string;
}

/** What is behind an operation's line, under a loupe whose factor is printed. */
export function OpenedRows({ opened, filter, columns, scaleSeconds, timeZone }: OpenedProps) {
  const { lines, segments } = opened;
  const own = seamScale(lines.flatMap(({ pair }) => pair ?? []));
  const loupe = loupeOf(scaleSeconds, own);
  return (
    <>
      <tr data-line="">
        <td colSpan={columns} className="seam-tabs">
          <div>
            <nav aria-label="Opened by">
              {openings.map((by) => (
                <Link
                  key={by}
                  href={seamAddress("/analytics/seam", filter, { by, ticket: "" })}
                  scroll={false}
                  aria-current={by === filter.by ? "true" : undefined}
                >
                  {words[by]}
                </Link>
              ))}
            </nav>
            <p>
              <span className="text-ink-2">{loupe > 1 ? `loupe: scale ×${loupe}` : ""}</span>
              <SaveLink path="/analytics/seam/csv" filter={{ ...filter, ticket: "", over: "" }} />
            </p>
          </div>
        </td>
      </tr>
      {lines.map((line) => {
        const isOpen = filter.by === "ticket" && line.key === filter.ticket;
        return (
          <Fragment key={line.key}>
            <LineRow
              line={line}
              isUnder
              name={nameOf(line.key, filter.by)}
              spoken={line.key || without[filter.by]}
              scaleSeconds={scaleSeconds / loupe}
              opener={
                filter.by === "ticket" && <TicketOpener {...{ filter, isOpen }} ticket={line.key} />
              }
            />
            {isOpen &&
              segments.map((segment) => (
                <SegmentRow
                  key={`${segment.startMs} ${segment.activity} ${segment.cell}`}
                  segment={segment}
                  timeZone={timeZone}
                />
              ))}
          </Fragment>
        );
      })}
    </>
  );
}

function TicketOpener(props: { filter: SeamFilter; isOpen: boolean; ticket: string }) {
  const { filter, isOpen, ticket } = props;
  const href = seamAddress("/analytics/seam", filter, { ticket: isOpen ? "" : ticket });
  return <LineOpener href={href} isOpen={isOpen} label={`Time on ${ticket}`} />;
}

function nameOf(key: string, by: Opening) {
  if (by === "ticket") return <TicketLink number={key} links />;
  if (by === "week") return `from ${dayText(key, "en-GB")}`;
  return key || without[by];
}
