import { and, asc, eq, inArray, isNull, or, sql } from "drizzle-orm";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { kioskCells, kiosks } from "@/db/kiosks/tables";
import { workers } from "@/db/people/tables";
import { operations } from "@/db/standards/tables";
import { ticketOperations, tickets } from "@/db/tickets/tables";
import { shifts } from "@/db/timeline/tables";
import { cellsServedAt } from "@/lib/ledger/act-cell";

/** More than a cell can take up in a day: what a kiosk keeps of its queue. */
const QUEUE_MAX = 40;

/** Finds a kiosk's name and the cells that it serves at an instant, the first one first. */
export async function findServedCells({ db, siteId }: Scope, kioskId: string, at: Date) {
  const rows = await db
    .select({
      kiosk: kiosks.name,
      cellId: kioskCells.cellId,
      cell: cells.name,
      from: kioskCells.effectiveFrom,
      position: kioskCells.position,
    })
    .from(kiosks)
    .innerJoin(
      kioskCells,
      and(eq(kioskCells.siteId, kiosks.siteId), eq(kioskCells.kioskId, kiosks.id)),
    )
    .innerJoin(cells, and(eq(cells.siteId, kioskCells.siteId), eq(cells.id, kioskCells.cellId)))
    .where(and(eq(kiosks.siteId, siteId), eq(kiosks.id, kioskId)));
  const served = rows.map(({ from, ...row }) => ({ ...row, fromMs: from.getTime() }));
  const ids = cellsServedAt(served, at.getTime());
  const nameOf = new Map(served.map(({ cellId, cell }) => [cellId, cell]));
  return {
    kiosk: rows[0]?.kiosk ?? "",
    cells: ids.map((id) => ({ id, name: nameOf.get(id) ?? "" })),
  };
}

/**
 * Lists the people of some cells by number: whose home cell is one of them, and who works in one now.
 * Those whose last day is before `today` (site date) are left out unless they are in.
 */
export async function listCellPeople(
  { db, siteId }: Scope,
  { cellIds, today }: { cellIds: readonly string[]; today: string },
) {
  const isHome = inArray(workers.homeCellId, [...cellIds]);
  const stays = or(isNull(workers.endsOn), sql`${workers.endsOn} >= ${today}`);
  return db
    .select({
      worker: workers.number,
      name: workers.name,
      language: workers.language,
      homeHere: sql<boolean>`${isHome}`,
      inSince: shifts.startAt,
    })
    .from(workers)
    .leftJoin(
      shifts,
      and(eq(shifts.siteId, workers.siteId), eq(shifts.workerId, workers.id), isNull(shifts.endAt)),
    )
    .where(
      and(eq(workers.siteId, siteId), or(and(isHome, stays), inArray(shifts.cellId, [...cellIds]))),
    )
    .orderBy(asc(workers.number));
}

/** Lists what some cells could work on, by due date: operations begun or ready on open tickets. */
export async function listCellQueue({ db, siteId }: Scope, cellIds: readonly string[]) {
  return db
    .select({ ticket: tickets.number, operation: operations.code })
    .from(ticketOperations)
    .innerJoin(
      operations,
      and(
        eq(operations.siteId, ticketOperations.siteId),
        eq(operations.id, ticketOperations.operationId),
      ),
    )
    .innerJoin(
      tickets,
      and(eq(tickets.siteId, ticketOperations.siteId), eq(tickets.id, ticketOperations.ticketId)),
    )
    .where(
      and(
        eq(ticketOperations.siteId, siteId),
        inArray(operations.cellId, [...cellIds]),
        inArray(ticketOperations.state, ["ready", "working"]),
        eq(tickets.status, "open"),
      ),
    )
    .orderBy(asc(tickets.dueOn), asc(tickets.seq), asc(ticketOperations.position))
    .limit(QUEUE_MAX);
}
