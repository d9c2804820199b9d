import type { Scope } from "@/db/client";
import { book } from "@/db/ledger/commands";
import { readContext } from "@/db/ledger/queries";
import { listOpenShifts, listWorkerNumbers } from "@/db/timeline/queries";
import { ruleAt } from "@/lib/time/site-day";
import { type Derived, deriveWindow } from "@/lib/timeline/derive";
import type { SiteRules } from "@/lib/timeline/schema";

/** How often a timeline is derived again because somebody booked meanwhile. */
const TRIES_MAX = 5;

/** Before and after everything that a ledger can hold. */
const EVER = [Date.UTC(2000, 0, 1), Date.UTC(9999, 0, 1)];

/**
 * Closes, provisionally, the shifts that were open past their limit by `now`: nobody ended them, and
 * the worker is asked. The moment is kept, so that a rebuild closes the same ones.
 *
 * @returns how many workers that was
 */
export async function closeOverdueShifts(
  scope: Scope,
  rules: readonly SiteRules[],
  now: Date,
): Promise<number> {
  const open = await listOpenShifts(scope);
  const overdue = open.filter(({ startAt }) => {
    const { shiftLimitSeconds } = ruleAt(rules, startAt.getTime());
    return now.getTime() > startAt.getTime() + shiftLimitSeconds * 1000;
  });
  for (const { number, startAt } of overdue) {
    await deriveAgain(scope, { number, instants: [startAt.getTime()], asOfMs: now.getTime() });
  }
  return overdue.length;
}

/**
 * Derives every worker's whole timeline from the ledger, as of the recorded moments, and writes what
 * differs. On a sound database that is nothing.
 *
 * @returns how many rows of segments, shifts, counts and loose ends were put right
 */
export async function rebuildTimelines(scope: Scope): Promise<number> {
  let changed = 0;
  for (const number of await listWorkerNumbers(scope)) {
    changed += await deriveAgain(scope, { number, instants: EVER, asOfMs: 0 });
  }
  return changed;
}

/** Derives a worker's windows at some instants again; answers how many rows that changed. */
async function deriveAgain(
  scope: Scope,
  asked: { number: string; instants: readonly number[]; asOfMs: number },
): Promise<number> {
  const { number, instants, asOfMs } = asked;
  for (let tries = 0; tries < TRIES_MAX; tries += 1) {
    const { windows, rules } = await readContext(scope, {
      kioskId: null,
      numbers: [],
      sessions: [],
      ids: [],
      touched: instants.map((atMs) => ({ number, atMs })),
      targets: [],
      items: [],
      benchAtMs: null,
    });
    const [window] = windows;
    if (!window) return 0;
    const derived = deriveWindow(window, [], { rules, asOfMs });
    const changes = countChanges(derived);
    if (changes === 0) return 0;
    const timelines = [{ workerId: window.workerId, window, derived, isTouched: true }];
    const booking = { siteId: scope.siteId, kioskId: null, rows: [], timelines, sessions: [] };
    if (await book(scope, booking)) return changes;
  }
  throw new Error(`worker ${number}: the timeline changes faster than it can be derived`);
}

function countChanges({ segments, shifts, reports, looseEnds }: Derived): number {
  return [segments, shifts, reports, looseEnds].reduce(
    (total, { gone, changed }) => total + gone.length + changed.length,
    0,
  );
}
