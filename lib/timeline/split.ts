import { assert } from "@/lib/assert";
import { sum } from "@/lib/sum";

/**
 * Shares whole seconds among items in proportion to their weights, losing none.
 * Largest remainder (Hamilton): each item gets its floor, the seconds left over go to the
 * largest fractions, ties to the earlier item. Without any weight the shares are equal.
 *
 * @param seconds length to share: integer, 0 or more
 * @param weights one per item: integers, 0 or more, in any one unit; at least one item
 * @returns integer seconds in the order of `weights`; they sum to `seconds`
 * @throws RangeError on anything else, or where seconds × weights pass 2^53: a caller's mistake
 */
export function split(seconds: number, weights: readonly number[]): number[] {
  const total = sum(weights);
  assert(weights.length > 0, "split: needs at least one item");
  assert(
    [seconds, ...weights].every((n) => Number.isInteger(n) && n >= 0),
    "split: whole numbers",
  );
  assert(Number.isSafeInteger(seconds * total), "split: too large to share exactly");
  if (total === 0)
    return split(
      seconds,
      weights.map(() => 1),
    );
  const shares = weights.map((weight) => Math.floor((seconds * weight) / total));
  const byFraction = weights.map((weight, item) => ({ item, left: (seconds * weight) % total }));
  byFraction.sort((a, b) => b.left - a.left); // stable: ties keep the order of the items
  for (const { item } of byFraction.slice(0, seconds - sum(shares))) shares[item]! += 1;
  return shares;
}
