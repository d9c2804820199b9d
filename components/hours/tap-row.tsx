import { TicketLink } from "@/components/tickets/ticket-link";
import type { StretchRow, TapLine } from "@/lib/hours/page";
import { tapWords } from "@/lib/hours/taps";
import { otherWorkWords } from "@/lib/ledger/other-work-words";
import { clockSecondText, secondsText } from "@/lib/time/format";

/** A record behind the figures of a day, and the time that it began. */
export function TapRow({
  line: { tap, began },
  timeZone,
  nowSecond,
  linksTickets,
}: {
  line: TapLine;
  timeZone: string;
  nowSecond: number;
  linksTickets: boolean;
}) {
  return (
    <tr data-line="">
      <td data-book="" data-spare="" />
      <td data-book="" className="code">
        {clockSecondText(tap.atMs, timeZone)}
      </td>
      <td data-book="" colSpan={2} className="desk-cut text-ink-2">
        {[tap.kiosk, tap.by && `entered by ${tap.by}`].filter(Boolean).join(", ")}
      </td>
      <td className="hours-tap" colSpan={9}>
        <span className="mr-4 font-[650]">{tapWords(tap)}</span>
        {tap.keptFor && <span className="mr-4 text-danger">kept, not counted ({tap.keptFor})</span>}
        {began.map((stretch) => (
          <Began
            key={stretch.item}
            stretch={stretch}
            nowSecond={nowSecond}
            linksTickets={linksTickets}
          />
        ))}
      </td>
    </tr>
  );
}

function Began({
  stretch,
  nowSecond,
  linksTickets,
}: {
  stretch: StretchRow;
  nowSecond: number;
  linksTickets: boolean;
}) {
  const { start, end, seconds, activity, ticket, operation, code, cell, said } = stretch;
  const length = (end ?? nowSecond) - start;
  const share = seconds !== null && seconds !== length;
  return (
    <span className="mr-4 inline-block">
      <b className="text-actual">{secondsText(seconds ?? length)}</b>{" "}
      {share && <span className="text-ink-2">of {secondsText(length)} shared </span>}
      {activity === "indirect" ? otherWorkWords(code) : activity}{" "}
      {ticket && (
        <>
          <TicketLink number={ticket} links={linksTickets} /> {operation}
        </>
      )}
      {cell && <span className="text-ink-2"> in {cell}</span>}
      {said && <span className="text-ink-2">, start said</span>}
      {end === null && <span className="text-ink-2">, runs on</span>}
    </span>
  );
}
