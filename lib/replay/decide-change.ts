import { no, ok, type Result } from "@/lib/result";
import { type StandardRow, standardInForce } from "@/lib/standards/in-force";
import type { StandardEntry } from "@/lib/standards/schema";
import { addDays } from "@/lib/time/site-day";

/** How far ahead a standard may be set: what is further is a slip of the pen. */
const AHEAD_DAYS = 366;

/** What must be known to judge a change. */
export interface ChangeFacts {
  /** The model's routing as it is now has the operation. */
  isInRouting: boolean;
  /** The model has the option; true where the base is meant. */
  isOption: boolean;
  /** The site date from which the model is known here. */
  modelSince: string;
  /** The site's production day. */
  today: string;
  /** All rows ever entered for the model and operation. */
  rows: readonly StandardRow[];
}

/**
 * Decides whether a standard may be set: for an operation that the model has, with time in it, from
 * a day that the model has known, and not as it stands already. The past may be set: what began
 * since then is earned again.
 */
export function decideChange(entry: StandardEntry, facts: ChangeFacts): Result<void> {
  const { model, operation, option, setupSeconds, runSeconds, effectiveFrom } = entry;
  const { isInRouting, isOption, modelSince, today, rows } = facts;
  if (!isInRouting) {
    return refused("operation", `${model} has no operation ${operation}. Look at its routing.`);
  }
  if (!isOption) return refused("option", `${model} has no option ${option}. Choose another.`);
  if (option === null && runSeconds === 0) {
    return refused(
      "runSeconds",
      "A standard of 0 earns nothing. Give the time that a piece takes.",
    );
  }
  if (effectiveFrom < modelSince) {
    return refused(
      "effectiveFrom",
      `${model} is known here since ${modelSince}. Give that day or a later one.`,
    );
  }
  if (effectiveFrom > addDays(today, AHEAD_DAYS)) {
    return refused("effectiveFrom", "That is more than a year ahead. Give an earlier day.");
  }
  if (stands({ option, setupSeconds, runSeconds, effectiveFrom }, rows)) {
    return refused(
      "runSeconds",
      "That is the standard of that day already. Change it, or the day.",
    );
  }
  return ok(undefined);
}

/** True where the rows of this base or option give the same figures on that day and ever after. */
function stands(
  draft: Pick<StandardRow, "option" | "setupSeconds" | "runSeconds" | "effectiveFrom">,
  rows: readonly StandardRow[],
): boolean {
  const own = rows
    .filter(({ option }) => option === draft.option)
    .map((row) => ({ ...row, option: null }));
  const standard = standardInForce(own, draft.effectiveFrom);
  return standard?.setupSeconds === draft.setupSeconds && standard.runSeconds === draft.runSeconds;
}

/** A field that cannot be taken, named as the contract names it. */
function refused(path: string, message: string) {
  return no("invalid", message, { errors: [{ path, message }] });
}
