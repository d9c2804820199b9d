import type { ItemFacts } from "@/lib/ledger/context";
import type { EventBody, Item } from "@/lib/ledger/schema";
import { type Standard, standardInForce } from "@/lib/standards/in-force";
import { type DayRule, productionDay } from "@/lib/time/site-day";
import { fairWeights } from "@/lib/timeline/weights";

/** So heavy that 200 such items still share 36 hours exactly, in numbers up to 2^53. */
export const WEIGHT_MAX = 100_000_000;

/**
 * The standard of a ticket operation: the one in force on the production day of its first setup, run
 * or inspect second, none booked of its first report, neither of `atMs`. Null where none is set.
 */
export function standardOf(
  facts: ItemFacts,
  rules: readonly DayRule[],
  atMs: number,
): Standard | null {
  const { standards, firstWorkMs, firstReportMs } = facts;
  const options = standards.flatMap(({ option }) => option ?? []);
  return standardInForce(
    standards,
    productionDay(firstWorkMs ?? firstReportMs ?? atMs, rules),
    options,
  );
}

/** Pieces that are still to be made at a ticket operation: the lot less scrap and good; 0 or more. */
export function openPieces({ quantity, earlierScrap, good, scrap }: ItemFacts): number {
  return Math.max(0, quantity - earlierScrap - good - scrap);
}

/**
 * The weights of the items of an act, in whole seconds, fixed when it is booked: an item's own where
 * the kiosk sent one, else by standard. An unknown ticket operation weighs the mean of the others.
 */
export function weigh(
  items: readonly Item[],
  factsOf: (item: Item) => ItemFacts | undefined,
  { rules, atMs }: { rules: readonly DayRule[]; atMs: number },
): number[] {
  const resolved = fairWeights(
    items.map((item) => {
      const facts = factsOf(item);
      if (!facts) return UNKNOWN;
      const standard = standardOf(facts, rules, atMs);
      const setupEarned = facts.good > 0;
      return { shareBy: facts.shareBy, standard, openPieces: openPieces(facts), setupEarned };
    }),
  );
  return items.map(({ weight }, place) => Math.min(weight ?? resolved[place] ?? 1, WEIGHT_MAX));
}

/**
 * The weight of a step that is tapped off: what it takes, should it share time with others of a bunch.
 * Null for every other act, and for a step that is not known.
 */
export function stepWeight(act: EventBody, facts: ItemFacts | undefined): number[] | null {
  if (act.kind !== "step-done") return null;
  const known = facts?.steps?.find(({ step }) => step === act.step);
  return known ? [Math.min(known.seconds, WEIGHT_MAX)] : null;
}

const UNKNOWN = { shareBy: "standard", standard: null, openPieces: 0, setupEarned: false } as const;
