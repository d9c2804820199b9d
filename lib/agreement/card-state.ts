import type { DayAgreement } from "@/lib/agreement/signatures";

/** Where a worker's card of a period stands, as the office says it. */
export type CardState = "to look at" | "agreed" | "closed";

/** What decides the state of a card. */
export interface CardFacts {
  /** The workdays with time on them; `agreement` null where one still runs. */
  days: readonly { agreement: DayAgreement | null }[];
  /** Loose ends of the period that nobody has settled. */
  openEnds: number;
  isClosed: boolean;
}

/**
 * Says where a card stands. It is agreed when nothing is left to settle and the lead has agreed to
 * every workday as it is now; the worker's own agreement is asked for and shown beside it, but
 * nobody goes unpaid for want of it (LEDGER.md 10). Nothing to agree to, and nothing open: agreed.
 */
export function cardState({ days, openEnds, isClosed }: CardFacts): CardState {
  if (isClosed) return "closed";
  const isAgreed = openEnds === 0 && days.every(({ agreement }) => agreement?.lead);
  return isAgreed ? "agreed" : "to look at";
}

/** Says whether the worker has agreed to every workday as it is now; false for a card without any. */
export function isSignedByWorker({ days }: Pick<CardFacts, "days">): boolean {
  return days.length > 0 && days.every(({ agreement }) => agreement?.worker);
}
