import type { Act } from "@/lib/acts/act";
import { effectiveEvents } from "@/lib/acts/effective";
import { reassigned } from "@/lib/acts/reassigned";
import { gatherEnds } from "@/lib/timeline/loose-ends";
import type { CountedReport, Folded, FoldFacts, LedgerEvent } from "@/lib/timeline/schema";
import { settlementsOf, withToldEnds } from "@/lib/timeline/settlements";
import { walk } from "@/lib/timeline/walk";

/**
 * Derives one worker's time from the events: segments that partition each shift, the counts that
 * stand, and what is odd as loose ends (LEDGER.md 3, 4 and 6). Pure, and the same on server and
 * kiosk: arrival order and duplicates play no part, and nothing is asked of a clock but `asOfMs`.
 * A window gives what the whole would give for it, if gaps longer than the shift limit and the rest
 * between shifts bound it and it holds the corrections of its events, whenever they were entered.
 *
 * @param events of one worker, in any order
 * @param facts what holds at the site and for the worker, each from its instant on
 * @param asOfMs epoch milliseconds: whether a shift without an end is past its limit
 * @returns segments, shifts and reports in order of time, loose ends by time and key
 */
export function fold(events: readonly LedgerEvent[], facts: FoldFacts, asOfMs: number): Folded {
  const { walked, acts, effective, settlements, unclear } = carryOut(events, facts, asOfMs);
  const { standing, lateUndos } = effective;
  return {
    segments: walked.segments,
    shifts: walked.shifts,
    reports: acts.flatMap((act) => countedReport(act) ?? []),
    looseEnds: gatherEnds({ found: walked.looseEnds, standing, lateUndos, unclear, settlements }),
    standing: walked.standing,
  };
}

/**
 * Carries out the corrections and walks. Where a shift ends decides whether a reassignment holds,
 * and none moves a shift's ends; so a first walk finds them. One that does not hold stands back and
 * corrects nothing: what it would have overruled counts again.
 */
function carryOut(
  events: readonly LedgerEvent[],
  facts: FoldFacts,
  asOfMs: number,
  refused: readonly string[] = [],
) {
  const effective = effectiveEvents(events, refused);
  const settlements = settlementsOf(effective.standing);
  const way = { facts, settlements, asOfMs };
  const told = withToldEnds(effective.acts, settlements, facts);
  const before = walk(told, way);
  const changed = reassigned(told, before.shiftOf);
  if (changed.refused.length > 0)
    return carryOut(events, facts, asOfMs, [...refused, ...changed.refused]);
  const unclear = [...refused, ...changed.incomplete];
  return {
    walked: changed.acts === told ? before : walk(changed.acts, way),
    acts: changed.acts,
    effective,
    settlements,
    unclear: effective.standing.filter(({ id }) => unclear.includes(id)),
  };
}

function countedReport({ id, atMs, body, cell }: Act): CountedReport | null {
  if (body.kind !== "report" && body.kind !== "inspect") return null;
  const { kind, ticket, operation, good, rework, scrap, causedBy, defects } = body;
  const stop = body.kind === "report" && body.stop;
  return {
    event: id,
    kind,
    atMs,
    ticket,
    operation,
    good,
    rework,
    scrap,
    stop,
    causedBy: causedBy ?? null,
    defects: defects ?? [],
    cell,
  };
}
