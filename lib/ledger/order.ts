/** What decides the place of an event in a worker's ledger. */
export interface Ordered {
  id: string;
  /** The instant it counts at, epoch milliseconds. */
  atMs: number;
  /** The running number that its kiosk gave it. */
  seq: number;
  kiosk: string | null;
}

/**
 * Puts events in the ledger's order (LEDGER.md 2): by instant, then by `seq` within one kiosk,
 * then by id.
 * No comparison of two events can say that: at one instant two events of one kiosk go by `seq`, each
 * of them against a third kiosk's by id, and these may go round in a circle. So each kiosk's own row
 * is kept, and the rows of one instant are merged by the ids at their heads. Arrival plays no part.
 *
 * @returns a new list
 */
export function inOrder<T extends Ordered>(events: readonly T[]): T[] {
  const sorted = [...events].sort((a, b) => a.atMs - b.atMs || bySeq(a, b));
  const ordered: T[] = [];
  for (let start = 0; start < sorted.length; ) {
    let end = start + 1;
    while (sorted[end]?.atMs === sorted[start]!.atMs) end += 1;
    ordered.push(...merge(sorted.slice(start, end)));
    start = end;
  }
  return ordered;
}

function bySeq(a: Ordered, b: Ordered): number {
  return a.seq - b.seq || byId(a, b);
}

function byId(a: Ordered, b: Ordered): number {
  return a.id < b.id ? -1 : a.id > b.id ? 1 : 0;
}

/** Merges the kiosks' rows of one instant, each sorted by `seq`, taking the smallest head first. */
function merge<T extends Ordered>(events: T[]): T[] {
  const kiosks = [...new Set(events.map(({ kiosk }) => kiosk))];
  if (kiosks.length === 1) return events;
  const rows = kiosks.map((kiosk) => events.filter((event) => event.kiosk === kiosk));
  const merged: T[] = [];
  while (merged.length < events.length) {
    const [row] = rows.filter((row) => row.length > 0).sort((a, b) => byId(a[0]!, b[0]!));
    merged.push(row!.shift()!);
  }
  return merged;
}
