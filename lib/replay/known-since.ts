import { type DayRule, productionDay } from "@/lib/time/site-day";

/**
 * The day from which a model is known at a site: that on which it was put on file, or the first for
 * which a standard was ever entered, where that is earlier, as when the past was brought along.
 */
export function knownSince(
  { createdAt, firstStandardOn }: { createdAt: Date; firstStandardOn: string | null },
  rules: readonly DayRule[],
): string {
  const filedOn = productionDay(createdAt.getTime(), rules);
  return firstStandardOn !== null && firstStandardOn < filedOn ? firstStandardOn : filedOn;
}
