import type { Act } from "@/lib/acts/act";
import { inOrder } from "@/lib/ledger/order";
import type { LooseEndCode } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";
import { ruleAt } from "@/lib/time/site-day";
import type { FoldFacts, LedgerEvent } from "@/lib/timeline/schema";

/** What a person answered to a loose end, and the event that says so. */
interface Settlement {
  answer: string;
  event: LedgerEvent;
}

/** Answers by the key of their loose end. */
export type Settlements = ReadonlyMap<string, Settlement>;

/** The key of a loose end, as a `settle` names it: "no-shift-end:" and the id it hangs on. */
export function endKey(code: LooseEndCode, subject: string): string {
  return `${code}:${subject}`;
}

/**
 * The answers that stand; the last in order counts for each loose end.
 *
 * @param standing events of one worker in order, those that were taken back left out
 */
export function settlementsOf(standing: readonly LedgerEvent[]): Settlements {
  return new Map(
    standing.flatMap((event) =>
      event.body.kind === "settle"
        ? [[event.body.end, { answer: event.body.answer, event }] as const]
        : [],
    ),
  );
}

const NO_SHIFT_END = "no-shift-end:";
const END_AT = "end-at:";

/**
 * Puts in the shift ends that were told afterwards: "end-at:" with an RFC 3339 instant answers
 * `no-shift-end`. An end in the future of its answer is none; an end that the worker's own, late
 * record contradicts gives way to it.
 *
 * @param acts in order
 * @returns acts in order
 */
export function withToldEnds(
  acts: readonly Act[],
  settlements: Settlements,
  facts: FoldFacts,
): readonly Act[] {
  const told = [...settlements].flatMap(([key, settlement]) => toldEnd(key, settlement) ?? []);
  const kept = told.filter((end) => !isTapped(end, acts, facts));
  return kept.length > 0 ? inOrder([...acts, ...kept]) : acts;
}

function toldEnd(key: string, { answer, event }: Settlement): Act | null {
  if (!key.startsWith(NO_SHIFT_END) || !answer.startsWith(END_AT)) return null;
  const atMs = instantMs(answer.slice(END_AT.length));
  if (atMs === null || atMs > event.atMs) return null;
  const closes = key.slice(NO_SHIFT_END.length);
  return { ...event, atMs, body: { kind: "shift-end" }, out: [], closes };
}

/** Says whether the next start or end after the told one is the same shift's own end. */
function isTapped(told: Act, acts: readonly Act[], { rules }: FoldFacts): boolean {
  const start = acts.find(({ id }) => id === told.closes);
  const next = acts.find(
    ({ atMs, body }) =>
      atMs > told.atMs && (body.kind === "shift-start" || body.kind === "shift-end"),
  );
  if (!start || next?.body.kind !== "shift-end") return false;
  return next.atMs - start.atMs <= ruleAt(rules, start.atMs).shiftLimitSeconds * 1000;
}
