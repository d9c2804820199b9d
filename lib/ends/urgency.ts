import type { LooseEndCode } from "@/lib/ledger/schema";

/**
 * The codes in the order in which they matter: first what leaves out somebody's time or guesses it,
 * then what may book it wrongly, last what is only to be known. Within one rank the oldest is first.
 */
const ranks: readonly (readonly LooseEndCode[])[] = [
  [
    "no-shift-end",
    "objection",
    "unproved",
    "unknown-worker",
    "id-clash",
    "unreadable",
    "revoked",
    "future",
    "deduction-unattested",
  ],
  [
    "implied-start",
    "break-open",
    "two-kiosks",
    "session-late",
    "clock-unmeasured",
    "since-outside",
    "undo-late",
    "unknown-ticket",
    "over-count",
    "count-without-work",
  ],
  [
    "shift-long",
    "break-long",
    "already-in",
    "past-finish",
    "ticket-scrapped",
    "on-hold",
    "no-qualification",
    "out-of-order",
    "wrong-cell",
    "rest-short",
  ],
];

/** How a rank is headed in a list. */
export const rankWords = [
  "Somebody's time depends on it",
  "The time may stand wrong",
  "To be known",
] as const;

/** Every code with its rank, 0 for the worst; what has none is last. */
export const rankOf: ReadonlyMap<string, number> = new Map(
  ranks.flatMap((codes, rank) => codes.map((code) => [code, rank] as const)),
);
