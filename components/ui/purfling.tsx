import type { CSSProperties } from "react";

/** How the seam burns down before a screen signs out: whole seconds, after `waitSeconds` of rest. */
export interface Burn {
  seconds: number;
  waitSeconds?: number;
}

/**
 * The seam of a page: three plies, dark, light, dark, from its top edge down. With `burn` its light
 * ply burns in from both ends; give the element a new `key` to fill it again. A `stale` seam is
 * dashed: what the page shows is no longer fresh. Its parent is positioned.
 */
export function Purfling({ burn, stale = false }: { burn?: Burn; stale?: boolean }) {
  const times = burn && {
    "--burn": `${burn.seconds}s`,
    "--burn-steps": burn.seconds,
    "--wait": `${burn.waitSeconds ?? 0}s`,
  };
  return (
    <i
      aria-hidden
      className="purfling"
      data-burning={burn ? "" : undefined}
      data-stale={stale ? "" : undefined}
      style={times as CSSProperties}
    />
  );
}
