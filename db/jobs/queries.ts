import type { Db } from "@/db/client";
import { dirtyMarks } from "@/db/jobs/tables";

/** Counts the marks that wait to be derived again, of all sites. */
export async function countDirtyMarks(db: Db): Promise<number> {
  return db.$count(dirtyMarks);
}
