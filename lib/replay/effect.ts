import { type Draft, rowsWith } from "@/lib/replay/draft";
import { decidingDay } from "@/lib/standards/deciding-day";
import { type Standard, type StandardRow, standardInForce } from "@/lib/standards/in-force";
import { sum } from "@/lib/sum";
import type { DayRule } from "@/lib/time/site-day";

/** A ticket operation of the model, open or finished, as far as a change concerns it. */
export interface TouchedOperation {
  ticket: string;
  isOpen: boolean;
  openQuantity: number;
  firstWorkMs: number | null;
  /** The first count, where there is one. */
  firstCountMs: number | null;
  options: readonly string[];
  standards: readonly StandardRow[];
}

/** What setting a draft does, in tickets. */
export interface Effect {
  /** Open and not begun: they take it, if they begin on its day or later. */
  takes: string[];
  /** What the plan of those grows by; less than 0 where it shrinks. */
  plannedSeconds: number;
  /** Open and begun before its day: they keep theirs to their end. */
  keeps: string[];
  /** Begun on its day or since: they are earned again. Only a draft for a day that is past has any. */
  again: string[];
}

/**
 * What happens to the tickets of a model when a drafted standard is set (CALCULATIONS.md 3): a
 * ticket operation has one standard, that of the day on which it began, so those begun before keep
 * theirs. Tickets come in the order given.
 */
export function effectOf(
  operations: readonly TouchedOperation[],
  { draft, rules }: { draft: Draft; rules: readonly DayRule[] },
): Effect {
  const dated = operations
    .filter(({ options }) => draft.option === null || options.includes(draft.option))
    .map((one) => ({
      ...one,
      day: decidingDay({ workMs: one.firstWorkMs, countMs: one.firstCountMs }, rules),
    }));
  const numbers = (some: readonly TouchedOperation[]) => some.map(({ ticket }) => ticket);
  const takes = dated.filter(({ day, isOpen }) => isOpen && day === null);
  return {
    takes: numbers(takes),
    plannedSeconds: sum(takes.map((one) => plannedSeconds(one, draft))),
    keeps: numbers(
      dated.filter(({ day, isOpen }) => isOpen && day !== null && day < draft.effectiveFrom),
    ),
    again: numbers(dated.filter(({ day }) => day !== null && day >= draft.effectiveFrom)),
  };
}

/** How much more of the plan a ticket that has not begun takes, as of the draft's day. */
function plannedSeconds(
  { standards, options, openQuantity }: TouchedOperation,
  draft: Draft,
): number {
  const lengthOf = (standard: Standard | null) =>
    standard ? standard.setupSeconds + standard.runSeconds * openQuantity : 0;
  const day = draft.effectiveFrom;
  return (
    lengthOf(standardInForce(rowsWith(draft, standards), day, options)) -
    lengthOf(standardInForce(standards, day, options))
  );
}
