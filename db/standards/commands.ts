import { sql } from "drizzle-orm";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import { markStandard } from "@/db/seam/commands";
import { listModels, listRouting, listStandardEntries } from "@/db/standards/entries";
import { operations, options, standards } from "@/db/standards/tables";
import { decideChange } from "@/lib/replay/decide-change";
import { knownSince } from "@/lib/replay/known-since";
import { no, ok, type Result } from "@/lib/result";
import { standardItemOf } from "@/lib/standards/item";
import type { StandardEntry, StandardItem } from "@/lib/standards/schema";
import { type DayRule, productionDay } from "@/lib/time/site-day";

/** Who enters a standard, and when. */
interface Hand {
  by: string;
  now: Date;
  rules: readonly DayRule[];
}

/**
 * Sets a standard from a day on: a row is added and none is changed. The same id again is the same
 * row, and with another content it is refused. For a day that is past, what began since then is
 * earned again, in the background.
 */
export async function setStandard(
  scope: Scope,
  { id, ...entry }: StandardEntry & { id: string },
  { by, now, rules }: Hand,
): Promise<Result<StandardItem>> {
  return scope.db.transaction(async (db) => {
    const within = { ...scope, db };
    // two planners at once: the later one judges what the earlier one has set
    await db.execute(
      sql`select pg_advisory_xact_lock(hashtextextended(${`standards ${scope.siteId}`}, 0))`,
    );
    const before = await findEntry(within, id);
    if (before) return isSame(before, entry) ? ok(before) : alreadyUsed();
    const [all, routing, rows] = [
      await listModels(within),
      await listRouting(within, entry.model),
      await listStandardEntries(within, { model: entry.model, operation: entry.operation }),
    ];
    const model = all.find(({ name }) => name === entry.model);
    if (!model) return notFound(entry.model);
    const decided = decideChange(entry, {
      isInRouting: routing.some(({ operation }) => operation === entry.operation),
      isOption: entry.option === null || model.options.includes(entry.option),
      modelSince: knownSince(model, rules),
      today: productionDay(now.getTime(), rules),
      rows,
    });
    if (!decided.ok) return decided;
    await addRow(within, { id, modelId: model.id, ...entry }, by);
    const { operation, effectiveFrom: from } = entry;
    await markStandard(within, { modelId: model.id, operation, from });
    const { reason: _reason, ...detail } = entry;
    await recordAct(within, { by, action: "standards.set", subject: `standard:${id}`, detail });
    return ok(standardItemOf((await listStandardEntries(within, { id }))[0]!));
  });
}

async function findEntry(scope: Scope, id: string): Promise<StandardItem | null> {
  const [row] = await listStandardEntries(scope, { id });
  return row ? standardItemOf(row) : null;
}

function isSame(before: StandardItem, entry: StandardEntry): boolean {
  const keys = Object.keys(entry) as (keyof StandardEntry)[]; // safe because a schema made it
  return keys.every((key) => before[key] === entry[key]);
}

function alreadyUsed() {
  return no("conflict", "Another standard was set with this key already. Take a new one.");
}

function notFound(model: string) {
  const message = `No model here is called ${model}.`;
  return no("invalid", message, { errors: [{ path: "model", message }] });
}

async function addRow(
  { db, siteId }: Scope,
  row: StandardEntry & { id: string; modelId: string },
  by: string,
): Promise<void> {
  const { id, modelId, setupSeconds, runSeconds, effectiveFrom, reason } = row;
  const operationId = sql`(
    select ${operations.id} from ${operations}
    where ${operations.siteId} = ${siteId} and ${operations.code} = ${row.operation})`;
  const optionId = sql`(
    select ${options.id} from ${options}
    where ${options.siteId} = ${siteId} and ${options.modelId} = ${modelId}
      and ${options.name} = ${row.option})`;
  const figures = { setupSeconds, runSeconds, effectiveFrom, reason };
  await db
    .insert(standards)
    .values({ siteId, id, modelId, operationId, optionId, ...figures, enteredBy: by });
}
