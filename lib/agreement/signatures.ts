/** A `confirm` of the ledger: who agreed to what, and when. */
export interface Confirmed {
  atMs: number;
  /** Null where the worker agreed; else who did for the cell. */
  by: string | null;
  subject: string;
}

/** Somebody's agreement to a day. */
interface Signature {
  atMs: number;
  by: string | null;
}

/** Who agreed to a day as it is now. */
export interface DayAgreement {
  worker: Signature | null;
  lead: Signature | null;
  /** True where someone agreed to the day as it was before, and not since: they are asked again. */
  hasLapsed: boolean;
}

const SUBJECT = /^workday:(\d{4}-\d{2}-\d{2}):([0-9a-f]{64})$/;

/** The subject of a `confirm`: one workday of one worker, as its digest says it was. */
export function agreementSubject(date: string, digest: string): string {
  return `workday:${date}:${digest}`;
}

/** Reads a `confirm`'s subject; null where it is about something else. */
export function readAgreement(subject: string): { date: string; digest: string } | null {
  const [, date, digest] = SUBJECT.exec(subject) ?? [];
  return date && digest ? { date, digest } : null;
}

/**
 * Says who has agreed to a workday as it is: an agreement holds for one digest and lapses with it
 * (LEDGER.md 4), and comes to hold again where the day is put back as it was. The latest counts.
 *
 * @param confirms of the one worker, in any order
 */
export function agreementOf(
  confirms: readonly Confirmed[],
  day: { date: string; digest: string },
): DayAgreement {
  const about = confirms.filter(({ subject }) => readAgreement(subject)?.date === day.date);
  const held = about
    .filter(({ subject }) => readAgreement(subject)?.digest === day.digest)
    .sort((a, b) => b.atMs - a.atMs);
  const worker = signature(held.find(({ by }) => by === null));
  const lead = signature(held.find(({ by }) => by !== null));
  const isAgain = about.some(({ by }) => (by === null ? worker : lead) === null);
  return { worker, lead, hasLapsed: isAgain };
}

function signature(confirmed: Confirmed | undefined): Signature | null {
  return confirmed ? { atMs: confirmed.atMs, by: confirmed.by } : null;
}
