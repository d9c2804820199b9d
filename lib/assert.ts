/**
 * Stops a caller's mistake at once, with words that say which rule was broken.
 *
 * @throws RangeError with `message` when `condition` does not hold
 */
export function assert(condition: boolean, message: string): asserts condition {
  if (!condition) throw new RangeError(message);
}
