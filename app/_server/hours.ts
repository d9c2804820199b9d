import "server-only";
import { siteOf } from "@/app/_server/site";
import type { HoursWanted } from "@/db/hours/queries";
import type { Reach } from "@/lib/access/may";
import { type DayRange, type HoursFilter, rangeOf } from "@/lib/hours/filter";
import { addDays, dayBounds, listDays, productionDay } from "@/lib/time/site-day";

/** Who asks for hours, and how far they may see. */
export interface HoursAsker {
  siteId: string;
  workerId: string | null;
  reach: Reach;
  /** Ids of the cells they lead. */
  cells: readonly string[];
}

/** Turns a filter into what the queries want: production days of the site, within the reach. */
export async function hoursWanted(
  { siteId, workerId, reach, cells }: HoursAsker,
  filter: HoursFilter,
  now: Date,
): Promise<{ wanted: Omit<HoursWanted, "limit">; range: DayRange }> {
  const { rules } = await siteOf(siteId);
  const range = rangeOf(filter, productionDay(now.getTime(), rules));
  const days = listDays(range.from, addDays(range.to, 1)).map((date) => ({
    date,
    ...dayBounds(date, rules),
  }));
  // someone who is no worker has no hours of their own: an id that is nobody's
  const own = reach === "self" ? (workerId ?? siteId) : null;
  const homeCells = reach === "cells" ? cells : null;
  return { range, wanted: { days, homeCells, cell: filter.cell || undefined, workerId: own, now } };
}
