import { showTicket } from "@/lib/codes/ticket-code";
import { tapWords } from "@/lib/hours/taps";
import type { EventBody, LooseEndCode } from "@/lib/ledger/schema";
import { clockText } from "@/lib/time/format";

/** What is known of a loose end, to be told in sentences; instants are epoch milliseconds. */
export interface StoryFacts {
  code: LooseEndCode;
  atMs: number;
  eventMs: number | null;
  receivedMs: number | null;
  body: EventBody | null;
  kiosk: string | null;
  by: string | null;
  ticket: string | null;
  shift: { startMs: number; endMs: number | null; provisional: boolean } | null;
  planned: { startMs: number; endMs: number } | null;
}

/** Later than this after it was tapped a record came from a kiosk that was offline. */
const LATE_MS = 120_000;

/** Tells what is known of a loose end, in short sentences; the first is of the record itself. */
export function storyOf(facts: StoryFacts, timeZone: string): string[] {
  const clock = (ms: number) => clockText(ms, timeZone);
  const { code, atMs, shift, planned } = facts;
  const plan = planned
    ? `Planned ${clock(planned.startMs)} to ${clock(planned.endMs)}.`
    : "Nothing was planned.";
  if (code === "no-shift-end") {
    const provisional = shift?.endMs
      ? [`The time stands to ${clock(shift.endMs)} until then.`]
      : [];
    return [`The last tap was at ${clock(atMs)}.`, plan, ...provisional];
  }
  const own = recordWords(facts, clock);
  const ticket = facts.ticket ? [`It is about ${showTicket(facts.ticket)}.`] : [];
  const span = shift
    ? [`The shift ran from ${clock(shift.startMs)}${ending(shift.endMs, clock)}.`]
    : [];
  return [own, ...ticket, ...span, plan];
}

function ending(endMs: number | null, clock: (ms: number) => string): string {
  return endMs === null ? " and runs" : ` to ${clock(endMs)}`;
}

function recordWords(
  { body, eventMs, atMs, receivedMs, kiosk, by }: StoryFacts,
  clock: (ms: number) => string,
): string {
  if (!body) return `It came at ${clock(receivedMs ?? atMs)}${kiosk ? ` from ${kiosk}` : ""}.`;
  const at = eventMs ?? atMs;
  const parts = [
    `${upper(tapWords({ kind: body.kind, body: { ...body } }))} at ${clock(at)}`,
    kiosk && `on ${kiosk}`,
    by && `entered by ${by}`,
    receivedMs !== null && receivedMs - at > LATE_MS && `handed in at ${clock(receivedMs)}`,
  ];
  return `${parts.filter(Boolean).join(", ")}.`;
}

function upper(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
