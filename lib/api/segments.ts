import { z } from "zod";
import { cursor } from "@/lib/api/cursor";
import { filterName, page, pageLimit } from "@/lib/api/page";
import { ITEMS_MAX, instant, workerNumber } from "@/lib/ledger/schema";
import { siteDate } from "@/lib/time/schema";

/** Where a page of segments ended: days first, then one worker after the other (LEDGER.md 11). */
const segmentPosition = z.object({
  day: z.iso.date(),
  worker: z.uuid(),
  start: z.number().int().min(0).max(Date.UTC(2200, 0)),
  item: z.number().int().min(0).max(ITEMS_MAX),
});
export type SegmentPosition = z.infer<typeof segmentPosition>;

/** GET /api/v1/segments: production days of the site from `from` until before `to`. */
export const segmentsQuery = z.strictObject({
  from: siteDate.optional(),
  to: siteDate.optional(),
  cell: filterName.optional(),
  cursor: cursor(segmentPosition).optional(),
  limit: pageLimit,
});

/**
 * What someone did in a stretch of a shift; several tickets at once are several segments with the
 * same start and end, which share its seconds.
 */
export const bookedSegment = z.object({
  start: instant,
  /** Null while it runs. */
  end: instant.nullable(),
  /** This ticket's fair share of the stretch; null while it runs. */
  seconds: z.number().int().min(0).nullable(),
  activity: z.enum(["setup", "run", "rework", "inspect", "indirect", "meal", "rest", "unassigned"]),
  ticket: z.string().nullable(),
  operation: z.string().nullable(),
  /** The other-work code of indirect time. */
  code: z.string().nullable(),
  cell: z.string().nullable(),
  /** True where the start was said afterwards, not tapped. */
  said: z.boolean(),
  /** Only for those who may know. */
  worker: z.object({ worker: workerNumber, name: z.string() }).optional(),
});
export type BookedSegment = z.infer<typeof bookedSegment>;

/** A segment in the list, with the production day on which it begins. */
const daySegment = bookedSegment.extend({ day: z.iso.date() });

export const segmentPage = page(daySegment);
