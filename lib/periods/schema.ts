import { z } from "zod";
import { cursor } from "@/lib/api/cursor";
import { page, pageLimit } from "@/lib/api/page";
import { lineOrNone } from "@/lib/forms";
import { instant } from "@/lib/ledger/schema";
import { fileFormats, fileTotals } from "@/lib/periods/file";

/** GET /api/v1/periods: the latest first. */
export const periodsQuery = z.strictObject({
  cursor: cursor(z.object({ from: z.iso.date() })).optional(),
  limit: pageLimit,
});

const period = z.object({
  id: z.uuid(),
  from: z.iso.date(),
  /** Exclusive. */
  to: z.iso.date(),
  status: z.enum(["open", "closed"]),
  /** The last closing, also one that was reopened; 0 before the first. */
  revision: z.number().int().min(0),
  closedAt: instant.nullable(),
  closedBy: z.string().nullable(),
  /** SHA-256 of the frozen rows, in hex. */
  digest: z.string().nullable(),
  /** What stands beside its file; null while it is open. */
  totals: fileTotals.nullable(),
});
export type PeriodView = z.infer<typeof period>;

export const periodPage = page(period);

const format = z.enum(fileFormats, `Ask for one of: ${fileFormats.join(", ")}.`);
const revision = z.coerce.number().int().min(1).optional();

/** GET /api/v1/periods/{id}/export: the last closing's file, or that of an earlier one. */
export const exportQuery = z.strictObject({ format: format.default("json"), revision });

/** Closes a period; `named` are workers whose cards are closed with something open. */
export const closeForm = z
  .strictObject({
    period: z.uuid("Load the page again."),
    named: z.union([z.uuid(), z.array(z.uuid()).max(10_000)]).default([]),
    reason: lineOrNone(200),
  })
  .transform(({ named, reason, ...rest }) => ({
    ...rest,
    named: [named].flat(),
    reason: reason ?? "",
  }));

/** What the address says of the cards wanted; anything odd in it counts as not said. */
export const cardsFilter = z.object({
  period: z.uuid().catch(""),
  cell: z.string().max(200).catch(""),
  /** The number of the worker whose card is open, and the day whose reasons are. */
  worker: z
    .string()
    .regex(/^\d{1,8}$/)
    .catch(""),
  day: z.iso.date().catch(""),
});
export type CardsFilter = z.infer<typeof cardsFilter>;
