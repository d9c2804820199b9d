import "server-only";
import { siteOf } from "@/app/_server/site";
import { listCells } from "@/db/cells/queries";
import type { Scope } from "@/db/client";
import { findNextStart, listMissing, listOpenRows } from "@/db/floor/queries";
import type { FloorView } from "@/lib/floor/schema";
import { floorOf } from "@/lib/floor/view";

/** Reads the floor as it is at `now`, in one wave; asks for the next start only where nobody is in. */
export async function readFloor(scope: Scope, now: Date): Promise<FloorView> {
  const [site, cells, open, due] = await Promise.all([
    siteOf(scope.siteId),
    listCells(scope),
    listOpenRows(scope),
    listMissing(scope, now),
  ]);
  const opensAt = open.length === 0 ? await findNextStart(scope, now) : null;
  const names = cells.map(({ name }) => name);
  return floorOf({ cells: names, open, due, opensAt, rules: site.rules }, now.getTime());
}
