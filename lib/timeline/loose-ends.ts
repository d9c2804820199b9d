import type { LedgerEvent, LooseEnd } from "@/lib/timeline/schema";
import { endKey, type Settlements } from "@/lib/timeline/settlements";

/** Where a fold's loose ends come from. */
interface Sources {
  /** What the walk through the acts found. */
  found: readonly LooseEnd[];
  /** Every event that was not taken back: booking's own questions, and objections. */
  standing: readonly LedgerEvent[];
  lateUndos: readonly LedgerEvent[];
  /** Reassignments that a lead must look at. */
  unclear: readonly LedgerEvent[];
  settlements: Settlements;
}

/**
 * Gathers a worker's loose ends (LEDGER.md 6): each key once, settled where an answer stands, by
 * time and key. An objection, and a reassignment that could not be carried out, wait for the lead.
 */
export function gatherEnds(sources: Sources): LooseEnd[] {
  const { found, standing, lateUndos, unclear, settlements } = sources;
  const objections = standing.filter(({ body }) => body.kind === "object");
  const all = [
    ...found,
    ...standing.flatMap((event) => event.questions.map((code) => hangOn(event, code))),
    ...lateUndos.map((event) => hangOn(event, "undo-late")),
    ...[...objections, ...unclear].map((event) => hangOn(event, "objection")),
  ];
  const byKey = new Map(all.map((end) => [endKey(end.code, end.subject), end]));
  return [...byKey]
    .map(([key, end]) => ({ ...end, settled: end.settled || settlements.has(key) }))
    .sort(
      (a, b) => a.at - b.at || (endKey(a.code, a.subject) < endKey(b.code, b.subject) ? -1 : 1),
    );
}

function hangOn({ id, atMs }: LedgerEvent, code: LooseEnd["code"]): LooseEnd {
  return { code, subject: id, at: Math.floor(atMs / 1000), settled: false };
}
