import { no, ok, type Result } from "@/lib/result";
import { addDays, type DayRule, productionDay } from "@/lib/time/site-day";

/** A quarter with its first and last day; more is for several requests. */
const DAYS_MAX = 93;
const DAYS_DEFAULT = 7;

/**
 * The production days that a request for segments is about, `to` exclusive: without `to` up to and
 * with today, without `from` the seven days before `to`.
 *
 * @param atMs now, epoch milliseconds
 * @returns `invalid` for an empty range or one of more than 93 days
 */
export function decideSegmentRange(
  asked: { from?: string | undefined; to?: string | undefined },
  rules: readonly DayRule[],
  atMs: number,
): Result<{ from: string; to: string }> {
  const to = asked.to ?? addDays(productionDay(atMs, rules), 1);
  const from = asked.from ?? addDays(to, -DAYS_DEFAULT);
  if (from >= to) return refused("Give a `to` after `from`: it is exclusive.");
  if (to > addDays(from, DAYS_MAX)) return refused(`Ask for at most ${DAYS_MAX} days at once.`);
  return ok({ from, to });
}

function refused(message: string) {
  return no("invalid", message, { errors: [{ path: "to", message }] });
}
