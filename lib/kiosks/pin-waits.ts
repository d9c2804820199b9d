import { SHUT_SECONDS, TRIES_MAX, waitsSeconds } from "@/lib/access/throttle";

/**
 * How long to wait after the n-th wrong PIN in a row, at index n − 1, for each thing that is slowed
 * down. Of one worker on one tablet: as for passwords. Of one worker on all tablets together: much
 * slower to bite and never long, so that nobody locks a colleague out from another tablet, and shut
 * after the hundredth (NIST SP 800-63B 5.2.2). Of one tablet within an hour: its tries at many
 * workers, where honest slips are many too.
 */
export const pinWaits = {
  pair: waitsSeconds,
  worker: rising({ free: 9, firstSeconds: 5, longestSeconds: 60, shutAfter: TRIES_MAX }),
  kiosk: rising({ free: 29, firstSeconds: 2, longestSeconds: 30, shutAfter: null }),
};

function rising(curve: {
  free: number;
  firstSeconds: number;
  longestSeconds: number;
  shutAfter: number | null;
}): number[] {
  const { free, firstSeconds, longestSeconds, shutAfter } = curve;
  return Array.from({ length: TRIES_MAX }, (_, tries) => {
    if (tries + 1 === shutAfter) return SHUT_SECONDS;
    if (tries < free) return 0;
    return Math.min(longestSeconds, firstSeconds * 2 ** Math.min(10, tries - free));
  });
}
