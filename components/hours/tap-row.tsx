import { Correction } from "@/components/records/correction";
import type { FormAction } from "@/components/shell/use-answer";
import { TicketLink } from "@/components/tickets/ticket-link";
import type { StretchRow, TapLine } from "@/lib/hours/page";
import { isCorrectable, type Tap, tapWords } from "@/lib/hours/taps";
import { otherWorkWords } from "@/lib/ledger/other-work-words";
import { clockSecondText, secondsText } from "@/lib/time/format";
import { localDate } from "@/lib/time/site-day";

/** How records are put right, by someone who may: whose they are, and the action that does it. */
export interface TapCorrecting {
  worker: string;
  action: FormAction<void>;
}

/** A record behind the figures of a day, and the time that it began. */
export function TapRow({
  line: { tap, began },
  correcting,
  timeZone,
  nowSecond,
  linksTickets,
}: {
  line: TapLine;
  correcting: TapCorrecting | null;
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
        <span className="mr-4 font-[650]" data-gone={isGone(tap) ? "" : undefined}>
          {tapWords(tap)}
        </span>
        {tap.corrected && (
          <span className="mr-4 text-ink-2">{correctedWords(tap.corrected, timeZone)}</span>
        )}
        {tap.keptFor && <span className="mr-4 text-danger">kept, not counted ({tap.keptFor})</span>}
        {began.map((stretch) => (
          <Began
            key={stretch.item}
            stretch={stretch}
            nowSecond={nowSecond}
            linksTickets={linksTickets}
          />
        ))}
        {correcting && isCorrectable(tap) && (
          <CorrectTap tap={tap} correcting={correcting} timeZone={timeZone} />
        )}
      </td>
    </tr>
  );
}

function isGone({ corrected }: Tap): boolean {
  return corrected?.kind === "void";
}

function correctedWords({ kind, toMs }: NonNullable<Tap["corrected"]>, timeZone: string): string {
  return kind === "void" ? "taken out" : `moved to ${clockSecondText(toMs ?? 0, timeZone)}`;
}

function CorrectTap({
  tap,
  correcting: { worker, action },
  timeZone,
}: {
  tap: Tap;
  correcting: TapCorrecting;
  timeZone: string;
}) {
  const atMs = tap.corrected?.toMs ?? tap.atMs;
  const clock = clockSecondText(atMs, timeZone);
  const words = `${tapWords(tap)} at ${clock}`;
  return (
    <Correction
      action={action}
      label={`Correct: ${words}`}
      title={words}
      fields={{ worker, event: tap.id }}
      timeLabel="It was at"
      proposed={`${localDate(atMs, timeZone)}T${clock}`}
      deeds={[
        { deed: "move", label: "Move it there" },
        { deed: "void", label: "Take it out", tone: "danger" },
      ]}
    >
      correct
    </Correction>
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
