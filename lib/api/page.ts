import { z } from "zod";
import { cursorOf } from "@/lib/api/cursor";

/** Rows of a page when nobody says how many, and the most that one page holds. */
const PAGE_DEFAULT = 100;
const PAGE_MAX = 500;

/** The schema of a `limit` parameter. */
export const pageLimit = z.coerce.number().int().min(1).max(PAGE_MAX).default(PAGE_DEFAULT);

/** The schema of a filter by name; a database knows no text with a NUL in it. */
export const filterName = z
  .string()
  .min(1)
  .max(200)
  .refine((text) => !text.includes("\0"), "Give a name.");

/** The schema of a page's answer; `nextCursor` is null on the last page. */
export function page<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item), nextCursor: z.string().nullable() });
}

/**
 * Cuts a page off a list that was asked for `limit` + 1 rows: the row too many only tells that
 * there is a next page. `positionOf` says where a row stands in the list.
 */
export function pageOf<Row>(
  rows: readonly Row[],
  limit: number,
  positionOf: (row: Row) => unknown,
): { items: Row[]; nextCursor: string | null } {
  const items = rows.slice(0, limit);
  const last = items.at(-1);
  const isMore = rows.length > limit && last !== undefined;
  return { items, nextCursor: isMore ? cursorOf(positionOf(last)) : null };
}
