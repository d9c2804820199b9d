import { assert } from "@/lib/assert";
import { sum } from "@/lib/sum";

/** What decides the weight of one ticket operation among those worked on at once. */
export interface Weighable {
  /** As the operation says: by its standard, or each the same. */
  shareBy: "standard" | "equal";
  /** The standard in force, in whole seconds per setup and per piece; null where none is set. */
  standard: { setupSeconds: number; runSeconds: number } | null;
  openPieces: number;
  setupEarned: boolean;
}

/**
 * The fair-split weights of items worked on at once, in whole seconds (CALCULATIONS.md 2): run
 * standard × open pieces + the setup not yet earned. Time already spent lessens nothing, so a ticket
 * over its standard still bears its share. An item without a standard, or of an operation that
 * shares equally, weighs the mean of the others, half up. All of that kind, or nothing left on any:
 * equal. Resolved once, when the event is booked, and stored with it.
 *
 * @returns one weight per item, in their order
 */
export function fairWeights(items: readonly Weighable[]): number[] {
  const own = items.map(ownWeight);
  const known = own.filter((weight) => weight !== null);
  const total = sum(known);
  if (total === 0) return items.map(() => 1);
  const mean = Math.floor(total / known.length + 0.5);
  return own.map((weight) => weight ?? mean);
}

function ownWeight({ shareBy, standard, openPieces, setupEarned }: Weighable): number | null {
  if (shareBy === "equal" || standard === null) return null;
  assert(openPieces >= 0, "fairWeights: open pieces are 0 or more");
  return standard.runSeconds * openPieces + (setupEarned ? 0 : standard.setupSeconds);
}
