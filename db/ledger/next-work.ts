import type { BookingContext } from "@/lib/ledger/context";

/** How long a proposal is as good as a new one; who taps it is told how its ticket stands anyway. */
const KEPT_MS = 2000;

type Next = BookingContext["next"];
const kept = new Map<string, { next: Next; untilMs: number }>();

/** Gives what these kiosks could take up next, where it was read a moment ago: half of a read's cost. */
export function keptNext(kioskIds: readonly string[]): Map<string, Next> {
  const now = performance.now();
  return new Map(
    kioskIds.flatMap((id) => {
      const known = kept.get(id);
      return known && known.untilMs > now ? [[id, known.next] as const] : [];
    }),
  );
}

/** Keeps what was just read of what kiosks could take up next. */
export function keepNext(read: ReadonlyMap<string, Next>): void {
  const untilMs = performance.now() + KEPT_MS;
  for (const [id, next] of read) kept.set(id, { next, untilMs });
}
