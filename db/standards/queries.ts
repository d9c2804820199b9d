import { and, asc, eq, inArray, type SQL } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { operations, options, standards } from "@/db/standards/tables";
import { type TicketsWanted, ticketsOnPage } from "@/db/tickets/queries";
import type { StandardRow } from "@/lib/standards/in-force";

/** Lists every standard ever entered for a model, with the operation's code; options by name. */
export async function listStandardsOfModel(scope: Scope, modelId: string) {
  return listStandards(scope, eq(standards.modelId, modelId));
}

/** Lists every standard ever entered for the models on a page of tickets. */
export async function listStandardsOnPage(scope: Scope, wanted: TicketsWanted) {
  const page = ticketsOnPage(scope, wanted);
  const modelIds = scope.db.select({ modelId: page.modelId }).from(page);
  return listStandards(scope, inArray(standards.modelId, modelIds));
}

async function listStandards({ db, siteId }: Scope, ofModels: SQL) {
  const rows = await db
    .select({
      modelId: standards.modelId,
      operation: operations.code,
      seq: standards.seq,
      option: options.name,
      setupSeconds: standards.setupSeconds,
      runSeconds: standards.runSeconds,
      effectiveFrom: standards.effectiveFrom,
    })
    .from(standards)
    .innerJoin(
      operations,
      and(eq(operations.siteId, standards.siteId), eq(operations.id, standards.operationId)),
    )
    .leftJoin(
      options,
      and(eq(options.siteId, standards.siteId), eq(options.id, standards.optionId)),
    )
    .where(and(eq(standards.siteId, siteId), ofModels))
    .orderBy(asc(standards.seq));
  return rows satisfies (StandardRow & { operation: string })[];
}
