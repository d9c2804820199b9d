import { and, asc, desc, eq, gt, sql } from "drizzle-orm";
import { accounts } from "@/db/access/tables";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import {
  models,
  operations,
  options,
  routingOperations,
  routings,
  standards,
} from "@/db/standards/tables";

/** A standard as it was entered, with the names of what it is for and of who entered it. */
const entry = {
  id: standards.id,
  seq: standards.seq,
  model: models.name,
  operation: operations.code,
  operationName: operations.name,
  option: options.name,
  setupSeconds: standards.setupSeconds,
  runSeconds: standards.runSeconds,
  effectiveFrom: standards.effectiveFrom,
  reason: standards.reason,
  /** The name of the account, or what the row itself says. */
  enteredBy: sql<string>`coalesce(${accounts.name}, ${standards.enteredBy})`,
  enteredAt: standards.createdAt,
};

/** A model by its name; null is the first one by name, so that a page need not ask for it first. */
export type ModelName = string | null;

const isModel = ({ siteId }: Scope, name: ModelName) =>
  eq(models.name, name ?? sql`(select min(m.name) from ${models} m where m.site_id = ${siteId})`);

/** Lists what was ever entered, in the order of entry; `after` is the last sequence of a page. */
export async function listStandardEntries(
  scope: Scope,
  wanted: {
    id?: string;
    model?: ModelName | undefined;
    operation?: string | undefined;
    after?: number | undefined;
    limit?: number;
  },
) {
  const { db, siteId } = scope;
  const { id, model, operation, after, limit } = wanted;
  const rows = db
    .select(entry)
    .from(standards)
    .innerJoin(models, and(eq(models.siteId, standards.siteId), eq(models.id, standards.modelId)))
    .innerJoin(
      operations,
      and(eq(operations.siteId, standards.siteId), eq(operations.id, standards.operationId)),
    )
    .leftJoin(
      options,
      and(eq(options.siteId, standards.siteId), eq(options.id, standards.optionId)),
    )
    .leftJoin(accounts, sql`${standards.enteredBy} = 'account:' || ${accounts.id}`)
    .where(
      and(
        eq(standards.siteId, siteId),
        id === undefined ? undefined : eq(standards.id, id),
        model === undefined ? undefined : isModel(scope, model),
        operation === undefined ? undefined : eq(operations.code, operation),
        after === undefined ? undefined : gt(standards.seq, after),
      ),
    )
    .orderBy(asc(standards.seq));
  return limit === undefined ? rows : rows.limit(limit);
}
/** Lists the models that have a routing, by name, each with its options and since when it is known. */
export async function listModels({ db, siteId }: Scope) {
  // "models.id" by hand: with one table to select from, a column is written without its table
  const firstDay = sql<string | null>`(
    select min(s.effective_from)::text from ${standards} s
    where s.site_id = ${siteId} and s.model_id = models.id)`;
  const optionNames = sql<string[]>`array(
    select o.name from ${options} o
    where o.site_id = ${siteId} and o.model_id = models.id order by o.name)`;
  return db
    .select({
      id: models.id,
      name: models.name,
      kind: models.kind,
      createdAt: models.createdAt,
      firstStandardOn: firstDay,
      options: optionNames,
    })
    .from(models)
    .where(eq(models.siteId, siteId))
    .orderBy(asc(models.name));
}

/** Lists the operations of a model's latest routing, in route order. */
export async function listRouting(scope: Scope, model: ModelName) {
  const { db, siteId } = scope;
  const latest = db
    .select({ id: routings.id })
    .from(routings)
    .innerJoin(models, and(eq(models.siteId, routings.siteId), eq(models.id, routings.modelId)))
    .where(and(eq(routings.siteId, siteId), isModel(scope, model)))
    .orderBy(desc(routings.revision))
    .limit(1);
  return db
    .select({
      operation: operations.code,
      name: operations.name,
      stage: operations.stage,
      cell: cells.name,
    })
    .from(routingOperations)
    .innerJoin(
      operations,
      and(
        eq(operations.siteId, routingOperations.siteId),
        eq(operations.id, routingOperations.operationId),
      ),
    )
    .innerJoin(cells, and(eq(cells.siteId, operations.siteId), eq(cells.id, operations.cellId)))
    .where(
      and(eq(routingOperations.siteId, siteId), eq(routingOperations.routingId, sql`(${latest})`)),
    )
    .orderBy(asc(routingOperations.position));
}
