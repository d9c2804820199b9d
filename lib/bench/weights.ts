import { findOperation } from "@/lib/bench/offers";
import type { ItemKey, KioskState } from "@/lib/bench/schema";
import type { EventBody } from "@/lib/ledger/schema";
import { fairWeights } from "@/lib/timeline/weights";

/**
 * The fair-split weights of items as far as this tablet knows their standards: what it shows until
 * the server has answered. An operation that it does not know weighs the mean of the others.
 */
export function weightsHere(state: KioskState, items: readonly ItemKey[]): number[] {
  return fairWeights(
    items.map((item) => {
      const known = findOperation(state, item);
      const { setupSeconds, runSeconds } = known ?? { setupSeconds: null, runSeconds: null };
      const standard = runSeconds === null ? null : { setupSeconds: setupSeconds ?? 0, runSeconds };
      const openPieces = known?.openQuantity ?? 0;
      return {
        shareBy: "standard",
        standard,
        openPieces,
        setupEarned: known?.setupEarned ?? false,
      };
    }),
  );
}

/** The act with this tablet's own weights: sent along while the server is away (LEDGER.md 5). */
export function withWeights(state: KioskState, body: EventBody): EventBody {
  if (body.kind !== "work") return body;
  const weights = weightsHere(state, body.items);
  return { ...body, items: body.items.map((item, at) => ({ ...item, weight: weights[at] ?? 1 })) };
}
