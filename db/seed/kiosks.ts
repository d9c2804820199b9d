import { randomBytes } from "node:crypto";
import { v7 as uuidv7 } from "uuid";
import type { Scope } from "@/db/client";
import { kioskCells, kioskSessions, kiosks } from "@/db/kiosks/tables";
import { type FactoryIds, idOf } from "@/db/seed/factory";
import { inChunks } from "@/db/seed/in-chunks";
import { cells } from "@/lib/demo/cells";
import type { DemoSession } from "@/lib/simulation/record";

/**
 * Writes one kiosk a cell, as it stood there from the first day on, and answers their ids by cell.
 * Nobody holds their tokens: whoever tries the demo enrols a tablet of the own.
 */
export async function writeKiosks(
  { db, siteId }: Scope,
  ids: FactoryIds,
  { enrolledAt, lastSeenAt }: { enrolledAt: Date; lastSeenAt: Date },
): Promise<Map<string, string>> {
  const rows = cells.map(({ name }) => ({
    siteId,
    id: uuidv7(),
    name: `${name} 1`,
    tokenHash: randomBytes(32).toString("hex"),
    enrolledAt,
    lastSeenAt,
  }));
  await db.insert(kiosks).values(rows);
  await db.insert(kioskCells).values(
    rows.map(({ id }, at) => ({
      siteId,
      id: uuidv7(),
      kioskId: id,
      cellId: idOf(ids.cells, cells[at]!.name),
      effectiveFrom: enrolledAt,
    })),
  );
  return new Map(rows.map(({ id }, at) => [cells[at]!.name, id]));
}

/** Writes the sessions that the events of the history name. */
export async function writeSessions(
  { db, siteId }: Scope,
  ids: { kiosks: ReadonlyMap<string, string>; workers: ReadonlyMap<string, string> },
  sessions: readonly DemoSession[],
): Promise<void> {
  await inChunks(
    sessions.map(({ id, cell, worker, openedAtMs, endedAtMs }) => ({
      siteId,
      id,
      kioskId: idOf(ids.kiosks, cell),
      workerId: idOf(ids.workers, worker),
      openedAt: new Date(openedAtMs),
      endedAt: endedAtMs === null ? null : new Date(endedAtMs),
    })),
    (rows) => db.insert(kioskSessions).values(rows),
  );
}
