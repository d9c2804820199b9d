import { createHash } from "node:crypto";
import type { Scope } from "@/db/client";
import { readPolicyBook } from "@/db/pay/queries";
import { listCardWorkers, readTime, type TimeWanted } from "@/db/pay/time";
import { type Card, cardOf } from "@/lib/periods/card";
import { type GovernedWeek, governedWeeks } from "@/lib/policies/governed";
import type { PolicyBook } from "@/lib/policies/in-force";
import { addDays } from "@/lib/time/site-day";
import { type ZoneClock, zoneClock } from "@/lib/time/zone-clock";

/** The period whose cards are wanted. */
export interface CardsWanted {
  from: string;
  to: string;
  isClosed: boolean;
  timeZone: string;
  nowMs: number;
  /** Ids of workers; left out for all. */
  workers?: readonly string[];
  /** Ids of home cells; left out or null for all. */
  homeCells?: readonly string[] | null;
}

/** The cards of a period, by worker number, with the rules that they were made by. */
export interface Cards {
  cards: Card[];
  book: PolicyBook;
  /** When the last workday of everybody is over, epoch milliseconds; null without a policy. */
  overMs: number | null;
}

/** Shifts, workweeks and a changed start of them reach no further beyond a period. */
const AROUND_DAYS = 15;
/** Averages over 17 workweeks look back so far (2003/88/EC, article 16(b)). */
const AVERAGE_DAYS = 17 * 7;

/** SHA-256 of a text, in hex. */
export function sha256(text: string | Uint8Array): string {
  return createHash("sha256").update(text).digest("hex");
}

/** Reads the cards of a period: statements by the policies in force, agreements, open questions. */
export async function readCards(scope: Scope, wanted: CardsWanted): Promise<Cards> {
  const { from, to } = wanted;
  const book = await readPolicyBook(scope);
  const clock = zoneClock(wanted.timeZone);
  const window = windowsOf(wanted, book.versions, clock);
  const asked = { ...window, workers: wanted.workers ?? null, homeCells: wanted.homeCells ?? null };
  const people = await listCardWorkers(scope, asked, from);
  const times = await readTime(scope, people, window);
  const weeksOf = weeksByWorker(book, { from, to }, clock);
  const cards = times.map((time) => cardOf(time, { ...rulesOf(wanted, clock), weeksOf }));
  const lastDays = people.map(({ id }) => lastEnd(weeksOf(id), to));
  const isReady = book.choices.length > 0;
  const overMs = isReady ? Math.max(lastEnd(weeksOf(null), to), ...lastDays) * 1000 : null;
  return { cards, book, overMs };
}

function rulesOf({ from, to, nowMs, isClosed }: CardsWanted, clock: ZoneClock) {
  return { dates: { from, to }, clock, digestOf: sha256, nowMs, isClosed };
}

/** Nearly everybody is paid as the site is: those share their workweeks. */
function weeksByWorker(
  book: PolicyBook,
  dates: { from: string; to: string },
  clock: ZoneClock,
): (worker: string | null) => readonly GovernedWeek[] {
  const ofSite = governedWeeks(book, null, dates, clock);
  const apart = new Set(book.choices.map(({ worker }) => worker));
  return (worker) =>
    worker !== null && apart.has(worker) ? governedWeeks(book, worker, dates, clock) : ofSite;
}

/**
 * The windows of time that a period's cards need. A workday may begin at any hour of its date, so
 * the period reaches into the day after.
 */
export function windowsOf(
  { from, to }: { from: string; to: string },
  versions: PolicyBook["versions"],
  clock: ZoneClock,
): Pick<TimeWanted, "period" | "around"> {
  const midnight = (date: string) => clock.secondOf(date, "00:00") * 1000;
  const isAveraged = versions.some(({ policy }) => policy.limits === "eu-working-time");
  const back = isAveraged ? AVERAGE_DAYS : AROUND_DAYS;
  return {
    period: { startMs: midnight(from), endMs: midnight(addDays(to, 1)) },
    around: { startMs: midnight(addDays(from, -back)), endMs: midnight(addDays(to, AROUND_DAYS)) },
  };
}

function lastEnd(weeks: readonly GovernedWeek[], to: string): number {
  const days = weeks.flatMap(({ week }) => week.days).filter(({ date }) => date < to);
  return days.at(-1)?.end ?? 0;
}
