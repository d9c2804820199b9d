import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { listAuthors } from "@/db/ledger/authors";
import type { BookedBatch } from "@/db/ledger/commands";
import { readContext } from "@/db/ledger/queries";
import { isSame, itemsOn } from "@/lib/kiosks/bench-item";
import { benchOf } from "@/lib/kiosks/bench-view";
import type { Bench } from "@/lib/kiosks/schema";
import type { BookingContext, ItemFacts } from "@/lib/ledger/context";
import type { DerivedTimeline } from "@/lib/ledger/decide-booking";
import { deriveWindow } from "@/lib/timeline/derive";

/** Reads a worker's bench as of an instant, for the cells of a kiosk; null for an unknown number. */
export async function findBench(
  scope: Scope,
  { kioskId, number, at }: { kioskId: string; number: string; at: Date },
): Promise<Bench | null> {
  const atMs = at.getTime();
  const context = await readContext(scope, {
    kioskId,
    numbers: [number],
    sessions: [],
    ids: [],
    touched: [{ number, atMs }],
    targets: [],
    items: [],
    benchAtMs: atMs,
  });
  const [window] = context.windows;
  if (!window) return null;
  const derived = deriveWindow(window, [], { rules: context.rules, asOfMs: atMs });
  return showBench(scope, { window, derived, context, atMs });
}

/** The benches of a batch's workers, each to go with the last record that was proved to be theirs. */
export async function listBenches(
  scope: Scope,
  { timelines, lastOf, context }: BookedBatch,
  at: Date,
): Promise<Map<number, Bench>> {
  const benches = new Map<number, Bench>();
  for (const { workerId, window, derived } of timelines) {
    const last = lastOf.get(workerId);
    if (last === undefined) continue;
    const shown = { window, derived, context, atMs: at.getTime() };
    benches.set(last, await showBench(scope, shown));
  }
  return benches;
}

type Shown = Pick<DerivedTimeline, "window" | "derived"> & {
  context: BookingContext;
  atMs: number;
};

/** What a correction brings back may be something of which nothing was read yet. */
async function showBench(scope: Scope, { window, derived, context, atMs }: Shown): Promise<Bench> {
  const { folded } = derived;
  const unread = itemsOn(folded).filter(
    (item) => !context.facts.some((facts) => isSame(facts, item)),
  );
  const facts = unread.length
    ? [...context.facts, ...(await listItemFacts(scope, unread))]
    : context.facts;
  const bench = benchOf({ window, folded, context: { ...context, facts }, atMs });
  const names = await listAuthors(
    scope,
    bench.changes.map(({ by }) => by),
  );
  return {
    ...bench,
    changes: bench.changes.map((change) => ({ ...change, by: names.get(change.by) ?? change.by })),
  };
}

/** Lists what is known of ticket operations; unknown ones are left out. */
async function listItemFacts(
  { db, siteId }: Scope,
  items: readonly { ticket: string; operation: string }[],
): Promise<ItemFacts[]> {
  const { rows } = await db.execute<{ facts: ItemFacts[] | null }>(sql`select ticket_facts(
    ${siteId},
    ${sql.param(items.map(({ ticket }) => ticket))}::text[],
    ${sql.param(items.map(({ operation }) => operation))}::text[]) as facts`);
  return rows[0]?.facts ?? [];
}
