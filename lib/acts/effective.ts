import { type Act, insertedAct, takenOut } from "@/lib/acts/act";
import { inOrder } from "@/lib/ledger/order";
import { instantMs } from "@/lib/time/instant";
import type { LedgerEvent } from "@/lib/timeline/schema";

/** How long after an act it may be undone (LEDGER.md 3). */
const UNDO_MS = 10_000;

/** What is left of a ledger when its corrections are carried out. */
export interface Effective {
  /** In order: acts where they count, and of the corrections the `reassign` that hold. */
  acts: readonly Act[];
  /** Every event that was not taken back, corrections too, in the ledger's order. */
  standing: readonly LedgerEvent[];
  /** Undos that came too late, from another kiosk, or for an act that is not known. */
  lateUndos: readonly LedgerEvent[];
}

/**
 * Carries out `undo`, `void`, `move` and `insert` (LEDGER.md 3). What is undone or voided vanishes,
 * as does a correction that is itself undone or voided; what is moved counts at its new time, an
 * inserted act at its own, under the id of the record that inserted it. Among the corrections of one
 * act the last in order wins where they contradict: a move or reassignment after a void brings the
 * act back, and the last move and the last reassignment both hold, as one says when and one what.
 *
 * @param events of one worker, in any order; an id that comes twice counts once
 * @param refused ids of reassignments that do not hold: they correct nothing
 */
export function effectiveEvents(
  events: readonly LedgerEvent[],
  refused: readonly string[] = [],
): Effective {
  const ordered = inOrder([...new Map(events.map((event) => [event.id, event])).values()]);
  const about = correctionsByTarget(ordered.filter(({ id }) => !refused.includes(id)));
  const byId = new Map(ordered.map((event) => [event.id, event]));
  const stands = standingCheck(about, byId);
  const standing = ordered.filter(stands);
  /** The corrections that hold for an event: they stand, and no void came after them. */
  const holding = (id: string) => {
    const all = (about.get(id) ?? []).filter(stands);
    return all.slice(all.findLastIndex(({ body }) => body.kind === "void") + 1);
  };
  const acts = standing.flatMap((event) => {
    if (event.body.kind === "reassign" && !isInForce(event.body.event, event)) return [];
    return actOf(event, holding(event.id)) ?? [];
  });
  /** A reassignment of an act that vanished is void with it; of an unknown act it is a question. */
  function isInForce(target: string, event: LedgerEvent): boolean {
    const act = byId.get(target);
    if (act && !stands(act)) return false;
    return holding(target).findLast(({ body }) => body.kind === "reassign") === event;
  }
  return {
    acts: inOrder(acts),
    standing,
    lateUndos: standing.filter(
      (event) => event.body.kind === "undo" && !isInTime(event, byId.get(event.body.event)),
    ),
  };
}

/** The act that an event is, at the time at which it counts; null for one that only corrects. */
function actOf(event: LedgerEvent, corrections: readonly LedgerEvent[]): Act | null {
  const { kind } = event.body;
  if (actless.includes(kind)) return null;
  const inserted = insertedAct(event.body);
  if (kind === "insert" && !inserted) return null;
  const { atMs, body } = inserted ?? event;
  return { ...event, atMs: movedMs(corrections) ?? atMs, body, out: takenOut(body), closes: null };
}

/** Kinds that say something of other records, and nothing of what the worker does. */
const actless = ["undo", "void", "move", "settle", "object", "confirm", "release"];

function movedMs(corrections: readonly LedgerEvent[]): number | null {
  const moves = corrections.flatMap(({ body }) => (body.kind === "move" ? [body] : []));
  return instantMs(moves.at(-1)?.to ?? "");
}

/** The event that a correction of an act is about. */
function targetOf({ body }: LedgerEvent): string | null {
  switch (body.kind) {
    case "undo":
    case "void":
    case "move":
    case "reassign":
      return body.event;
    default:
      return null;
  }
}

/** The corrections of each event, in the ledger's order. */
function correctionsByTarget(ordered: readonly LedgerEvent[]): Map<string, LedgerEvent[]> {
  const about = new Map<string, LedgerEvent[]>();
  for (const event of ordered) {
    const target = targetOf(event);
    if (target === null) continue;
    about.set(target, [...(about.get(target) ?? []), event]);
  }
  return about;
}

/** Says of each event whether it was taken back; a correction counts only while it stands itself. */
function standingCheck(
  about: ReadonlyMap<string, readonly LedgerEvent[]>,
  byId: ReadonlyMap<string, LedgerEvent>,
): (event: LedgerEvent) => boolean {
  const known = new Map<string, boolean>();
  const stands = (event: LedgerEvent): boolean => {
    const answer = known.get(event.id);
    if (answer !== undefined) return answer;
    known.set(event.id, false); // cuts circles: what takes itself back in the end does not stand
    const corrections = (about.get(event.id) ?? []).filter(stands);
    const isUndone = corrections.some(
      (one) => one.body.kind === "undo" && isInTime(one, byId.get(event.id)),
    );
    const last = corrections.findLast(({ body }) => body.kind !== "undo");
    const isStanding = !isUndone && last?.body.kind !== "void";
    known.set(event.id, isStanding);
    return isStanding;
  };
  return stands;
}

/** An undo holds on the same kiosk, at most 10 s away; a tablet's clock may be set in between. */
function isInTime(undo: LedgerEvent, target: LedgerEvent | undefined): boolean {
  return (
    target !== undefined &&
    target.kiosk === undo.kiosk &&
    Math.abs(undo.atMs - target.atMs) <= UNDO_MS
  );
}
