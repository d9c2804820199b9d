import { and, asc, eq } from "drizzle-orm";
import type { Scope } from "@/db/client";
import { operations, options, standards } from "@/db/standards/tables";
import type { StandardRow } from "@/lib/standards/in-force";

/** Lists every standard ever entered for a model, with the operation's code; options by name. */
export async function listStandardsOfModel({ db, siteId }: Scope, modelId: string) {
  const rows = await db
    .select({
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
    .where(and(eq(standards.siteId, siteId), eq(standards.modelId, modelId)))
    .orderBy(asc(standards.seq));
  return rows satisfies (StandardRow & { operation: string })[];
}
