import { type Act, type ItemRef, isSameItem, itemRef } from "@/lib/acts/act";
import type { EventBody } from "@/lib/ledger/schema";

/** The reassignment of an activity: what it was, and what it is to be. */
interface Change {
  /** Items that the activity no longer has; they stand for what took them out. */
  removed: ItemRef[];
  added: ItemRef[];
  body: EventBody;
}

/** What the reassignments of a worker come to. */
export interface Reassigned {
  acts: readonly Act[];
  /** Ids of those that cannot be carried out: they change nothing. */
  refused: readonly string[];
  /** Ids of those whose counts could not follow. */
  incomplete: readonly string[];
}

/**
 * Carries out `reassign` (LEDGER.md 3): the worker's current or last activity becomes something else
 * from its beginning. Possible until the shift ends. Its counts follow when one item replaces one;
 * otherwise they stay where they are, with a question. What took an item out of the old activity
 * takes its replacement out of the new one, so that no time changes but what it is booked to.
 *
 * @param acts in order, with the reassignments that hold
 * @param shiftOf the shift in which each act lies, by the ids of the act and of the shift's start
 */
export function reassigned(acts: readonly Act[], shiftOf: ReadonlyMap<string, string>): Reassigned {
  const refused: string[] = [];
  const incomplete: string[] = [];
  let current = acts;
  for (const act of acts) {
    if (act.body.kind !== "reassign") continue;
    const { event } = act.body;
    const target = current.findIndex(({ id }) => id === event);
    const until = current.findIndex(({ id }) => id === act.id);
    const change = isOpenTo(current, { target, until }, shiftOf) && changeOf(current[target]!, act);
    if (!change) {
      refused.push(act.id);
      continue;
    }
    const { followers, isWhole } = follow(current.slice(target + 1, until), change);
    const { weights } = act;
    const moved = {
      ...current[target]!,
      body: change.body,
      weights,
      cell: act.cell ?? current[target]!.cell,
    };
    current = [...current.slice(0, target), moved, ...followers, ...current.slice(until)];
    if (!isWhole) incomplete.push(act.id);
  }
  return { acts: current, refused, incomplete };
}

/** Says whether the target is the current activity of the same shift, or the last one before it. */
function isOpenTo(
  acts: readonly Act[],
  { target, until }: { target: number; until: number },
  shiftOf: ReadonlyMap<string, string>,
): boolean {
  const [activity, reassign] = [acts[target], acts[until]];
  if (!activity || !reassign) return false;
  const shift = shiftOf.get(reassign.id);
  const latest = acts
    .slice(0, until)
    .filter((act) => isActivity(act) && shiftOf.get(act.id) === shift)
    .slice(-2);
  return latest.includes(activity);
}

function isActivity({ body }: Act): boolean {
  return body.kind === "work" || body.kind === "indirect";
}

function changeOf({ body }: Act, reassign: Act): Change | null {
  if (reassign.body.kind !== "reassign") return null;
  const { items, code, activity } = reassign.body;
  const since = "since" in body && body.since !== undefined ? { since: body.since } : {};
  const before = body.kind === "work" ? body.items : [];
  const after = items ?? [];
  const change = {
    removed: before.filter((item) => !after.some((one) => isSameItem(one, item))).map(itemRef),
    added: after.filter((item) => !before.some((one) => isSameItem(one, item))).map(itemRef),
  };
  if (items && code === undefined) {
    const doing = activity ?? (body.kind === "work" ? body.activity : "run");
    return { ...change, body: { kind: "work", activity: doing, items, ...since } };
  }
  if (code !== undefined && !items)
    return { ...change, body: { kind: "indirect", code, ...since } };
  return null; // neither or both: it does not say what it was
}

/** Carries the change through what came after the activity, up to the reassignment itself. */
function follow(
  acts: readonly Act[],
  { removed, added, body }: Change,
): { followers: Act[]; isWhole: boolean } {
  const isRemoved = (item: ItemRef) => removed.some((one) => isSameItem(one, item));
  const replacement = removed.length === 1 && added.length === 1 ? added[0]! : null;
  let left = removed;
  let isWhole = true;
  let [isCurrent, isOver] = [true, false];
  const followers = acts.map((act) => {
    if (isActivity(act)) {
      isCurrent = false;
      // from here on the old name means the new activity
      isOver ||= act.body.kind === "work" && act.body.items.some(isRemoved);
    }
    const followed = isOver ? act : renamed(act, isRemoved, replacement);
    if (followed === null) isWhole = false;
    if (!isCurrent || act.out === "all" || !act.out.some(isRemoved)) return followed ?? act;
    const { out } = act;
    left = left.filter((item) => !out.some((one) => isSameItem(one, item)));
    const kept = out.filter((item) => !isRemoved(item));
    const replaced = body.kind === "indirect" ? ("all" as const) : [...kept, ...added];
    return { ...(followed ?? act), out: left.length === 0 ? replaced : kept };
  });
  return { followers, isWhole };
}

/** A count of the old item under its new name; null where it has none to follow to. */
function renamed(
  act: Act,
  isRemoved: (item: ItemRef) => boolean,
  replacement: ItemRef | null,
): Act | null {
  const { body } = act;
  if ((body.kind !== "report" && body.kind !== "inspect") || !isRemoved(body)) return act;
  return replacement && { ...act, body: { ...body, ...replacement } };
}
