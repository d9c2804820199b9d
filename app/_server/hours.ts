import "server-only";
import { siteOf } from "@/app/_server/site";
import type { Scope } from "@/db/client";
import { type HoursWanted, sumHours } from "@/db/hours/queries";
import { cardsOf, type HoursCard } from "@/lib/hours/cards";
import { type DayRange, datesOf, type HoursQuery, rangeOf } from "@/lib/hours/range";
import { dayBounds, productionDay } from "@/lib/time/site-day";

/** Whose hours and of which days, as a person may see them. */
export interface HoursView {
  range: DayRange;
  within: readonly string[] | null;
}

/** Says which days a wish for hours means at the site, and which cells it may look into. */
export async function hoursView(
  scope: Scope,
  query: HoursQuery,
  { cells, now }: { cells: readonly string[] | null; now: Date },
): Promise<HoursView> {
  const { rules } = await siteOf(scope.siteId);
  const range = rangeOf(query, productionDay(now.getTime(), rules));
  if (!query.cell) return { range, within: cells };
  return { range, within: cells === null || cells.includes(query.cell) ? [query.cell] : [] };
}

/** Reads a page of workers' hours of a range, by production days of the site. */
export async function readCards(
  scope: Scope,
  range: DayRange,
  wanted: HoursWanted,
  now: Date,
): Promise<HoursCard[]> {
  const { rules } = await siteOf(scope.siteId);
  const days = datesOf(range).map((date) => ({ date, ...dayBounds(date, rules) }));
  return cardsOf(await sumHours(scope, days, wanted, now));
}
