/** Tries in a row that nothing slows down: fingers slip. */
const FREE_TRIES = 4;
const FIRST_WAIT_SECONDS = 5;
const LONGEST_WAIT_SECONDS = 3600;
/** NIST SP 800-63B 5.2.2: never more than 100 tries in a row; then only a new secret opens again. */
export const TRIES_MAX = 100;
/** Ten years: shut until an admin or a lead gives a new secret. */
export const SHUT_SECONDS = 10 * 365 * 86_400;

/**
 * How long to wait after the n-th wrong try in a row, at index n − 1: nothing for the first few, then
 * from five seconds doubling up to an hour, and shut after the hundredth. One right try begins anew.
 */
export const waitsSeconds: readonly number[] = Array.from({ length: TRIES_MAX }, (_, tries) => {
  if (tries + 1 === TRIES_MAX) return SHUT_SECONDS;
  if (tries < FREE_TRIES) return 0;
  return Math.min(LONGEST_WAIT_SECONDS, FIRST_WAIT_SECONDS * 2 ** (tries - FREE_TRIES));
});
