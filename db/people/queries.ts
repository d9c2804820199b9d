import { and, asc, eq, gte, ilike, inArray, isNull, max, or, type SQL, sql } from "drizzle-orm";
import { accounts, accountWorkers } from "@/db/access/tables";
import { cells } from "@/db/cells/tables";
import type { Scope } from "@/db/client";
import { workers } from "@/db/people/tables";

/** What the office may show of a worker; never the hash of a PIN. */
const shown = {
  id: workers.id,
  number: workers.number,
  name: workers.name,
  language: workers.language,
  cellId: workers.homeCellId,
  cell: cells.name,
  payrollNumber: workers.payrollNumber,
  pinSetAt: workers.pinSetAt,
  endsOn: workers.endsOn,
};

const homeCell = and(eq(cells.siteId, workers.siteId), eq(cells.id, workers.homeCellId));

/** Which workers a list is about. */
export interface WorkerFilter {
  /** Part of a name or number; empty for all. */
  text: string;
  /** The cells to look in; null for the whole site. */
  within: readonly string[] | null;
  /** Leaves out those whose last day is before this site date; null keeps them. */
  hereOn: string | null;
}

/**
 * Lists workers by name, with their home cell and the e-mail of the account that they are, if any.
 * `after` is the number of the last worker of the page before.
 */
export async function listWorkers(
  { db, siteId }: Scope,
  filter: WorkerFilter,
  page: { after: string | null; limit: number },
) {
  return db
    .select({ ...shown, email: accounts.email })
    .from(workers)
    .innerJoin(cells, homeCell)
    .leftJoin(
      accountWorkers,
      and(eq(accountWorkers.siteId, workers.siteId), eq(accountWorkers.workerId, workers.id)),
    )
    .leftJoin(accounts, eq(accounts.id, accountWorkers.accountId))
    .where(
      and(
        eq(workers.siteId, siteId),
        matching(filter),
        page.after === null
          ? undefined
          : sql`(${workers.name}, ${workers.number}) > (
              select w.name, w.number from workers w
              where w.site_id = ${siteId} and w.number = ${page.after})`,
      ),
    )
    .orderBy(asc(workers.name), asc(workers.number))
    .limit(page.limit);
}

/** Finds a worker by number, within the given cells only; null for one who is not there. */
export async function findWorker(
  { db, siteId }: Scope,
  number: string,
  within: readonly string[] | null,
) {
  const [worker] = await db
    .select(shown)
    .from(workers)
    .innerJoin(cells, homeCell)
    .where(
      and(
        eq(workers.siteId, siteId),
        eq(workers.number, number),
        within ? inArray(workers.homeCellId, [...within]) : undefined,
      ),
    )
    .limit(1);
  return worker ?? null;
}

/** Lists the numbers of the workers whose home is one of the cells. */
export async function listNumbersOf(
  { db, siteId }: Scope,
  cellIds: readonly string[],
): Promise<string[]> {
  const rows = await db
    .select({ number: workers.number })
    .from(workers)
    .where(and(eq(workers.siteId, siteId), inArray(workers.homeCellId, [...cellIds])))
    .orderBy(asc(workers.number));
  return rows.map(({ number }) => number);
}

/** The number that the next new worker may have: one more than the highest, from 1001. */
export async function findNextNumber({ db, siteId }: Scope): Promise<string> {
  const [highest] = await db
    .select({ number: max(sql<number>`${workers.number}::integer`) })
    .from(workers)
    .where(eq(workers.siteId, siteId));
  return String(Math.max(1000, Number(highest?.number ?? 0)) + 1);
}

function matching({ text, within, hereOn }: WorkerFilter): SQL | undefined {
  const part = `%${text.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
  return and(
    text ? or(ilike(workers.name, part), ilike(workers.number, part)) : undefined,
    within ? inArray(workers.homeCellId, [...within]) : undefined,
    hereOn ? or(isNull(workers.endsOn), gte(workers.endsOn, hereOn)) : undefined,
  );
}
