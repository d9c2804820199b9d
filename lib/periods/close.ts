import type { Card } from "@/lib/periods/card";
import { no, ok, type Result } from "@/lib/result";

/** What payroll says when it closes a period. */
export interface CloseAsked {
  /** Ids of workers whose cards are closed although something about them is open. */
  named: readonly string[];
  /** Why; empty where nobody is named. */
  reason: string;
}

/** The period as it is found under its lock. */
export interface CloseFacts {
  isClosed: boolean;
  closedBy: string | null;
  /** Whether the last workday is over. */
  isOver: boolean;
  hasPolicy: boolean;
  /** The first day of an earlier period that is still open; null where there is none. */
  openBefore: string | null;
  cards: readonly Pick<Card, "worker" | "state">[];
}

const NAMES_MAX = 5;

/**
 * Decides whether a period may be closed as asked: it is over, nobody closed it meanwhile, and every
 * card is agreed or closed by name with a reason, so that nobody goes unpaid for an open question
 * and no question is passed over unseen (LEDGER.md 10).
 *
 * @returns the reason for each worker that is closed by name
 */
export function decideClose(
  facts: CloseFacts,
  { named, reason }: CloseAsked,
): Result<ReadonlyMap<string, string>> {
  if (facts.isClosed) {
    return no("conflict", `${facts.closedBy} has closed this period already. Nothing was changed.`);
  }
  if (!facts.hasPolicy) return no("conflict", "Choose a pay policy for the site first.");
  if (!facts.isOver) return no("conflict", "This period still runs. Close it when it is over.");
  if (facts.openBefore) {
    return no(
      "conflict",
      `The period from ${facts.openBefore} is still open. Close that one first.`,
    );
  }
  const open = facts.cards.filter(({ state }) => state !== "agreed");
  const unnamed = open.filter(({ worker }) => !named.includes(worker.id));
  if (unnamed.length > 0) {
    const names = unnamed.slice(0, NAMES_MAX).map(({ worker }) => worker.name);
    const more = unnamed.length > NAMES_MAX ? ` and ${unnamed.length - NAMES_MAX} more` : "";
    const message = `Still to look at: ${names.join(", ")}${more}. Settle it, or close by name.`;
    return no("conflict", message, { errors: [{ path: "named", message }] });
  }
  if (open.length > 0 && reason.trim() === "") {
    const message = "Say why they are closed with something open.";
    return no("conflict", message, { errors: [{ path: "reason", message }] });
  }
  return ok(new Map(open.map(({ worker }) => [worker.id, reason.trim()])));
}
