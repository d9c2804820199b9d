import { and, eq } from "drizzle-orm";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import { sha256 } from "@/db/pay/cards";
import { listFrozenCards, listFrozenRows } from "@/db/pay/frozen";
import { findPeriod } from "@/db/pay/queries";
import { payExports, payRevisions } from "@/db/pay/tables";
import { FILE_LAYOUT, type FileFormat, type FileTotals, type PayFile } from "@/lib/periods/file";
import { payFileOf } from "@/lib/periods/frozen";
import { no, ok, type Result } from "@/lib/result";

/** Which file is wanted; without a revision that of the last closing. */
export interface ExportWanted {
  periodId: string;
  revision?: number | undefined;
  format: FileFormat;
  siteName: string;
  /** `account:<id>` or `key:<id>`. */
  by: string;
  now: Date;
  /** Writes the bytes of a file that was never made before. */
  write: (file: PayFile) => Promise<Uint8Array>;
}

/** A file of a closed period with what stands beside it. */
export interface ExportedFile {
  bytes: Uint8Array;
  /** SHA-256 of the bytes, in hex. */
  digest: string;
  revision: number;
  from: string;
  to: string;
  totals: FileTotals;
}

/**
 * Finds the file of a closed period, or makes it: its bytes are stored the first time and are the
 * same for ever (LEDGER.md 10). Two who ask at once get the same ones.
 *
 * @returns `notFound` for no such period or revision, `conflict` while it is open, `gone` after
 *   its bytes were erased
 */
export async function exportPeriod(
  scope: Scope,
  wanted: ExportWanted,
): Promise<Result<ExportedFile>> {
  const period = await findPeriod(scope, wanted.periodId);
  if (!period) return no("notFound", "There is no such pay period here.");
  const isPast = wanted.revision !== undefined && wanted.revision <= period.revision;
  if (!period.isClosed && !isPast) {
    return no("conflict", "This period is open. Close it, then its file can be made.");
  }
  const revision = wanted.revision ?? period.revision;
  if (revision > period.revision) return no("notFound", `There is no revision ${revision} of it.`);
  const file = (await findExport(scope, wanted, revision)) ?? (await make(scope, wanted, revision));
  if (!file.bytes) return no("gone", "This file was erased. Its digest and totals are kept.");
  const { bytes, ...rest } = file;
  return ok({ ...rest, bytes, revision, from: period.from, to: period.to });
}

async function make(scope: Scope, wanted: ExportWanted, revision: number) {
  const { db, siteId } = scope;
  const { periodId, format, by, now } = wanted;
  const file = await readPayFile(scope, { periodId, revision, siteName: wanted.siteName });
  const bytes = Buffer.from(await wanted.write(file));
  const row = { siteId, periodId, revision, layout: FILE_LAYOUT, format };
  const made = { bytes, digest: sha256(bytes), totals: file.totals, madeBy: by, madeAt: now };
  await db.transaction(async (tx) => {
    const added = await tx
      .insert(payExports)
      .values({ ...row, ...made })
      .onConflictDoNothing()
      .returning({ digest: payExports.digest });
    if (added.length === 0) return;
    const detail = { revision, format, digest: made.digest };
    const subject = `period:${periodId}`;
    await recordAct({ ...scope, db: tx }, { by, action: "periods.export", subject, detail });
  });
  // whoever came first has made it
  return (await findExport(scope, wanted, revision)) ?? made;
}

async function findExport(
  { db, siteId }: Scope,
  { periodId, format }: ExportWanted,
  revision: number,
) {
  const [found] = await db
    .select({ bytes: payExports.bytes, digest: payExports.digest, totals: payExports.totals })
    .from(payExports)
    .where(
      and(
        eq(payExports.siteId, siteId),
        eq(payExports.periodId, periodId),
        eq(payExports.revision, revision),
        eq(payExports.layout, FILE_LAYOUT),
        eq(payExports.format, format),
      ),
    )
    .limit(1);
  return found ?? null;
}

/** Reads what a closing froze as the content of its file. */
export async function readPayFile(
  scope: Scope,
  { periodId, revision, siteName }: { periodId: string; revision: number; siteName: string },
): Promise<PayFile> {
  const closing = { periodId, revision };
  const cards = await listFrozenCards(scope, closing);
  const days = await listFrozenRows(scope, closing);
  const { from, to, closedAt, closedBy, digest } = await findRevision(scope, closing);
  return payFileOf({
    site: siteName,
    period: { id: periodId, from, to },
    revision,
    closedAt: closedAt.toISOString(),
    closedBy,
    digest,
    cards: cards.map(({ id, ...card }) => ({ ...card, workerId: id })),
    days,
  });
}

/** A closing by itself, also one that was reopened since. */
async function findRevision(
  scope: Scope,
  { periodId, revision }: { periodId: string; revision: number },
) {
  const period = await findPeriod(scope, periodId);
  const [found] = await scope.db
    .select({
      closedAt: payRevisions.closedAt,
      closedBy: payRevisions.closedByName,
      digest: payRevisions.digest,
      totals: payRevisions.totals,
    })
    .from(payRevisions)
    .where(
      and(
        eq(payRevisions.siteId, scope.siteId),
        eq(payRevisions.periodId, periodId),
        eq(payRevisions.revision, revision),
      ),
    )
    .limit(1);
  if (!found || !period) throw new RangeError(`no revision ${revision} of period ${periodId}`);
  return { ...found, from: period.from, to: period.to };
}
