/** The longest standard that anyone may mean: what is longer is a slip of the pen. */
export const STANDARD_MAX_SECONDS = 100 * 3600;

/** A standard as the desk writes it, in minutes with one decimal, with two where seconds ask for it. */
export function minutesText(seconds: number): string {
  return (seconds / 60).toFixed(seconds % 6 === 0 ? 1 : 2);
}

/**
 * Reads minutes as people key them, "82", "82.5" or "82,5", into whole seconds, to the nearest.
 * Null where it is no such number; what is less than nothing is read too, so that it can be refused.
 */
export function secondsOfMinutes(text: string): number | null {
  const written = text.trim().replace(",", ".");
  if (!/^-?\d{1,6}(\.\d{1,4})?$/.test(written)) return null;
  return Math.round(Number(written) * 60);
}
