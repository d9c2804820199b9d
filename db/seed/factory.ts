import { v7 as uuidv7 } from "uuid";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { inChunks } from "@/db/seed/in-chunks";
import {
  models,
  operations,
  options,
  routingOperations,
  routingSteps,
  routings,
  standards,
} from "@/db/standards/tables";
import { assert } from "@/lib/assert";
import { cells as demoCells } from "@/lib/demo/cells";
import { models as demoModels } from "@/lib/demo/models";
import { operations as demoOperations, routingOf } from "@/lib/demo/operations";
import { standards as demoStandards } from "@/lib/demo/standards";
import { stepsOf } from "@/lib/demo/steps";
import { addDays } from "@/lib/time/site-day";

/** The ids under which the demo's factory was written, by the names of the scenario. */
export interface FactoryIds {
  cells: ReadonlyMap<string, string>;
  operations: ReadonlyMap<string, string>;
  models: ReadonlyMap<string, string>;
  /** By model and option: `Heron Natural satin`. */
  options: ReadonlyMap<string, string>;
}

/** Looks up an id that the scenario itself has written. */
export function idOf(ids: ReadonlyMap<string, string>, name: string): string {
  const id = ids.get(name);
  assert(id !== undefined, `the demo knows no ${name}`);
  return id;
}

/**
 * Writes the factory of the demo: cells, operations, models with their options and routings, and the
 * standards with their dates.
 *
 * @param startsOn the first day of the history
 */
export async function writeFactory(scope: Scope, startsOn: string): Promise<FactoryIds> {
  const ids = await writeCells(scope);
  await writeModels(scope, ids);
  await writeRoutings(scope, ids);
  await writeStandards(scope, ids, startsOn);
  return ids;
}

async function writeCells({ db, siteId }: Scope): Promise<FactoryIds> {
  const ids = {
    cells: idsFor(demoCells.map(({ name }) => name)),
    operations: idsFor(demoOperations.map(({ code }) => code)),
    models: idsFor(demoModels.map(({ name }) => name)),
    options: idsFor(demoModels.flatMap(({ name, options: all }) => all.map((o) => `${name} ${o}`))),
  };
  await db.insert(cells).values(
    demoCells.map(({ name }, position) => ({
      siteId,
      id: idOf(ids.cells, name),
      name,
      position,
    })),
  );
  await db.insert(operations).values(
    demoOperations.map(({ code, name, stage, cell, hazards }) => ({
      siteId,
      id: idOf(ids.operations, code),
      code,
      name,
      stage,
      cellId: idOf(ids.cells, cell),
      hazards: [...hazards],
    })),
  );
  return ids;
}

async function writeModels({ db, siteId }: Scope, ids: FactoryIds): Promise<void> {
  await db
    .insert(models)
    .values(
      demoModels.map(({ name, kind }) => ({ siteId, id: idOf(ids.models, name), name, kind })),
    );
  await db.insert(options).values(
    demoModels.flatMap(({ name: model, options: all }) =>
      all.map((name) => ({
        siteId,
        id: idOf(ids.options, `${model} ${name}`),
        modelId: idOf(ids.models, model),
        name,
      })),
    ),
  );
}

async function writeRoutings({ db, siteId }: Scope, ids: FactoryIds): Promise<void> {
  for (const model of demoModels) {
    const routingId = uuidv7();
    const modelId = idOf(ids.models, model.name);
    await db.insert(routings).values({ siteId, id: routingId, modelId, revision: 1 });
    const routing = routingOf(model).map(({ code }, position) => {
      return { code, row: { siteId, id: uuidv7(), routingId, position } };
    });
    await db
      .insert(routingOperations)
      .values(
        routing.map(({ code, row }) => ({ ...row, operationId: idOf(ids.operations, code) })),
      );
    const steps = routing.flatMap(({ code, row }) =>
      stepsOf(model, code).map(({ step, name, minutes }, position) => ({
        siteId,
        id: uuidv7(),
        routingOperationId: row.id,
        position,
        step,
        name,
        seconds: minutes * 60,
      })),
    );
    if (steps.length > 0) await db.insert(routingSteps).values(steps);
  }
}

async function writeStandards(
  { db, siteId }: Scope,
  ids: FactoryIds,
  startsOn: string,
): Promise<void> {
  await inChunks(
    demoStandards.map(({ model, operation, option, fromDay, ...rest }) => ({
      siteId,
      id: uuidv7(),
      modelId: idOf(ids.models, model),
      operationId: idOf(ids.operations, operation),
      optionId: option === null ? null : idOf(ids.options, `${model} ${option}`),
      effectiveFrom: addDays(startsOn, fromDay),
      enteredBy: "Larkmoor planning",
      ...rest,
    })),
    (rows) => db.insert(standards).values(rows),
  );
}

function idsFor(names: readonly string[]): Map<string, string> {
  return new Map(names.map((name) => [name, uuidv7()]));
}
