import { decidingDay } from "@/lib/standards/deciding-day";
import { type EarningReport, earnedSeconds } from "@/lib/standards/earned";
import { type Standard, type StandardRow, standardInForce } from "@/lib/standards/in-force";
import type { DayRule } from "@/lib/time/site-day";

/** A ticket operation as far as earning goes. */
export interface EarningOperation<R extends EarningReport> {
  /** Pieces that it has to do: the lot less what earlier operations lost. */
  quantity: number;
  /** Its first setup, run or inspect instant, epoch milliseconds; null where none is booked. */
  firstWorkMs: number | null;
  /** In the ledger's order; those of its rework operations are not among them. */
  reports: readonly (R & { atMs: number })[];
  /** All rows ever entered for the model and operation: the base and the adders. */
  standards: readonly StandardRow[];
  /** The ticket's options, in the terms of `standards`. */
  options: readonly string[];
  /**
   * When its setup is earned: with the first good piece, or when it is booked, since one setup then
   * serves several lots.
   */
  setupEarned: "first-good" | "when-booked";
}

/** What a ticket operation earned, report by report, under the one standard that holds for it. */
export interface OperationEarning<R> {
  /** Null: no standard, which earns nothing and is said, never taken for 0 %. */
  standard: Standard | null;
  reports: { report: R & { atMs: number }; seconds: number }[];
  /** The sum of `reports`; a setup that is earned when booked is not in it. */
  seconds: number;
}

/**
 * What a ticket operation earned (CALCULATIONS.md 3), under one standard for the whole of it: that
 * of the production day of its first work. A draft is tried by adding its row to `standards`.
 */
export function operationEarning<R extends EarningReport>(
  operation: EarningOperation<R>,
  rules: readonly DayRule[],
): OperationEarning<R> {
  const { reports, quantity, setupEarned } = operation;
  const standard = standardOf(operation, rules);
  const counted =
    standard && setupEarned === "when-booked" ? { ...standard, setupSeconds: 0 } : standard;
  const { byReport, seconds } = earnedSeconds(reports, { standard: counted, quantity });
  return {
    standard,
    seconds,
    reports: reports.map((report, at) => ({
      report,
      seconds: byReport[at]!.setupSeconds + byReport[at]!.runSeconds,
    })),
  };
}

function standardOf<R extends EarningReport>(
  { firstWorkMs, reports, standards, options }: EarningOperation<R>,
  rules: readonly DayRule[],
): Standard | null {
  const first = { workMs: firstWorkMs, countMs: reports[0]?.atMs ?? null };
  const day = decidingDay(first, rules);
  return day === null ? null : standardInForce(standards, day, options);
}
