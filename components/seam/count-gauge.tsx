import type { CSSProperties } from "react";

/** The pieces of a ticket as they were counted. */
export interface Count {
  good: number;
  rework: number;
  scrap: number;
}

const kinds = ["good", "rework", "scrap"] as const;

/** A leaf is a third longer than the ticket or the count, whichever is more. */
const ROOM = 4 / 3;

/**
 * Ticket against count, mirrored at the seam, one board a piece: good is solid, rework has its
 * grain across, scrap is crossed out; what is not counted yet is only outlined. `label` says the
 * same in words.
 */
export function CountGauge({
  ticket,
  count,
  label,
  flush = false,
  className = "",
}: {
  /** pieces that the ticket asks for */
  ticket: number;
  count: Count;
  label: string;
  flush?: boolean;
  className?: string;
}) {
  const counted = count.good + count.rework + count.scrap;
  const scale = Math.max(1, ticket, counted) * ROOM;
  const at = (pieces: number) => `${50 + (pieces / scale) * 50}%`;
  const wide = (pieces: number) => `${(pieces / scale) * 50}%`;
  const before = { good: 0, rework: count.good, scrap: count.good + count.rework };
  return (
    <span
      role="img"
      aria-label={label}
      className={`seam ${className}`}
      data-size="count"
      data-flush={flush ? "" : undefined}
      style={{ "--scale": scale } as CSSProperties}
    >
      <b className="seam-book" style={{ width: wide(ticket) }} />
      {kinds.map(
        (kind) =>
          count[kind] > 0 && (
            <b
              key={kind}
              className="seam-pieces"
              data-kind={kind}
              data-last={before[kind] + count[kind] === counted ? "" : undefined}
              style={{ left: at(before[kind]), width: wide(count[kind]) }}
            />
          ),
      )}
      {counted < ticket && (
        <b className="seam-hand" style={{ left: at(counted), width: wide(ticket - counted) }} />
      )}
    </span>
  );
}
