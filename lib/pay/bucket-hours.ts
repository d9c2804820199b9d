import type { Bucket } from "@/lib/pay/schema";
import { decimalHours } from "@/lib/time/format";

/**
 * Seconds by bucket as decimal hours that add up: the total is rounded once, half up, then the
 * buckets by largest remainder, ties to double, overtime, regular (CALCULATIONS.md 4).
 */
export function bucketHours(
  seconds: Readonly<Record<Bucket, number>>,
): Record<Bucket | "total", string> {
  const { total, parts } = decimalHours([seconds.double, seconds.overtime, seconds.regular]);
  const [double, overtime, regular] = parts;
  return { total, regular: regular!, overtime: overtime!, double: double! };
}
