import "server-only";
import type { SeamFilter } from "@/lib/analytics/filter";
import { type DaySpan, spanOf } from "@/lib/analytics/range";
import { addDays, type DayRule, productionDay } from "@/lib/time/site-day";

/** Which work a filter asks for, of which days, and the filter with its days said. */
export interface SeamWish {
  span: DaySpan;
  filter: SeamFilter;
  wanted: {
    cells: readonly string[] | null;
    cell: string | undefined;
    model: string | undefined;
    stage: string | undefined;
  };
}

/**
 * Turns a filter into what the queries want, within the asker's reach.
 *
 * @param cells ids of the cells that someone leads; null for the whole site
 */
export function seamWish(
  filter: SeamFilter,
  { cells, rules, now }: { cells: readonly string[] | null; rules: readonly DayRule[]; now: Date },
): SeamWish {
  const span = spanOf(filter, productionDay(now.getTime(), rules));
  const said = { ...filter, from: span.first, to: addDays(span.past, -1) };
  const { cell, model, stage } = filter;
  const or = (name: string) => name || undefined;
  return {
    span,
    filter: said,
    wanted: { cells, cell: or(cell), model: or(model), stage: or(stage) },
  };
}
