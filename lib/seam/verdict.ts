/** Standard against actual for the same work, in seconds; no standard is null. */
export interface SeamPair {
  standardSeconds: number | null;
  actualSeconds: number;
}

/** The word for a pair, and the whole minutes that stand beside it. */
export interface Verdict {
  word: "on-standard" | "over" | "left" | "under" | "no-standard";
  minutes: number;
}

/** Within this share of the standard the word is "on standard"; a site may set another. */
export const TOLERANCE_PERCENT = 5;

/** The whole minutes that a screen shows of a standard: to the nearest, halves up. */
export function standardMinutes(seconds: number): number {
  return Math.round(seconds / 60);
}

/** The whole minutes that a screen shows of time gone: only minutes that are full. */
export function actualMinutes(seconds: number): number {
  return Math.floor(seconds / 60);
}

/**
 * Answers in which word a pair is spoken of. Past the standard it is `over`; short of it, `left`
 * while the work runs and `under` once it is finished. Within the tolerance, the edge included, it
 * is `on-standard`, except that running work short of its standard always says what is left. The
 * minutes are the difference of the two figures on the screen, so that the screen adds up; where
 * they show none, the word is `on-standard`. Tolerance changes the word, never the drawing.
 */
export function seamVerdict(
  { standardSeconds, actualSeconds }: SeamPair,
  {
    finished,
    tolerancePercent = TOLERANCE_PERCENT,
  }: { finished: boolean; tolerancePercent?: number },
): Verdict {
  if (standardSeconds === null) {
    return { word: "no-standard", minutes: actualMinutes(actualSeconds) };
  }
  const apart = actualSeconds - standardSeconds;
  const minutes = Math.abs(standardMinutes(standardSeconds) - actualMinutes(actualSeconds));
  const within = Math.abs(apart) * 100 <= standardSeconds * tolerancePercent;
  const running = apart < 0 && !finished;
  if (minutes === 0 || (within && !running)) return { word: "on-standard", minutes };
  if (apart > 0) return { word: "over", minutes };
  return { word: running ? "left" : "under", minutes };
}
