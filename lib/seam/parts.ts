import type { SeamPair } from "@/lib/seam/verdict";

/** The pieces of a seam gauge as shares of a leaf, 0 to 1, each from where the one before ends. */
export interface SeamParts {
  /** the standard, on the book leaf */
  book: number;
  /** actual time up to the standard, on the day leaf */
  day: number;
  /** actual time past the standard, from the kerf outwards */
  over: number;
  /** the mirrored standard that is not used: only its outline */
  hand: number;
  /** actual or standard is longer than the leaf */
  folded: { book: boolean; day: boolean };
}

/**
 * Cuts a pair into the pieces of its gauge. The standard is mirrored: `day + hand` is `book`
 * whenever the actual is not past it, and an overhang begins exactly at the mirrored end. What is
 * longer than the leaf ends at its rim and is told as `folded`. Without a standard all of the
 * actual is `day`.
 */
export function seamParts(
  { standardSeconds, actualSeconds }: SeamPair,
  scaleSeconds: number,
): SeamParts {
  const share = (seconds: number) => Math.min(1, Math.max(0, seconds / scaleSeconds));
  const standard = standardSeconds ?? 0;
  const folded = { book: standard > scaleSeconds, day: actualSeconds > scaleSeconds };
  if (standardSeconds === null) {
    return { book: 0, day: share(actualSeconds), over: 0, hand: 0, folded };
  }
  const book = share(standard);
  const actual = share(actualSeconds);
  const day = Math.min(book, actual);
  return { book, day, over: actual - day, hand: book - day, folded };
}
