import type { BreakRules } from "@/lib/pay/schema";
import type { Stretch } from "@/lib/time/site-day";
import type { PayShift, Span } from "@/lib/timesheet/shifts";

/** Time that is paid, with the rate that it takes. */
export interface Paid extends Stretch {
  rate: string | null;
}

/** What was made of a break or a gap: one step of a day's trail. */
export interface BreakStep extends Stretch {
  rule: "rest-paid" | "rest-unpaid" | "meal-paid" | "meal-unpaid" | "off-duty";
}

/** A break that someone should look at. */
export interface BreakWarning extends Stretch {
  code: "rest-long" | "meal-short" | "meal-long" | "gap-short";
}

/** A shift after its breaks were judged; `paid` and the unpaid steps make up the whole shift. */
export interface JudgedShift {
  paid: Paid[];
  steps: BreakStep[];
  warnings: BreakWarning[];
}

/**
 * Judges each break of a shift by itself (29 CFR 785.18, 785.19; CALCULATIONS.md 4). A rest is paid
 * up to the limit; a longer one whole, or up to the limit where that was announced or the rest is as
 * long as a meal. A meal is unpaid from its minimum on, paid whole below. A gap is time off duty.
 */
export function judgeBreaks(shift: PayShift, rules: BreakRules): JudgedShift {
  const judged: JudgedShift = { paid: [], steps: [], warnings: [] };
  shift.spans.forEach((span, index) => {
    const before = shift.spans[index - 1];
    if (before && before.end < span.start) judgeGap(before.end, span.start, rules, judged);
    if (span.kind === "rest") judgeRest(span, rules, judged);
    else if (span.kind === "meal") judgeMeal(span, rules, judged);
    else judged.paid.push(paidOf(span));
  });
  return judged;
}

function judgeGap(start: number, end: number, rules: BreakRules, judged: JudgedShift): void {
  judged.steps.push({ rule: "off-duty", start, end });
  const isShort = end - start <= rules.restPaidUpToMinutes * 60;
  if (isShort) judged.warnings.push({ code: "gap-short", start, end });
}

function judgeRest(span: Span, rules: BreakRules, judged: JudgedShift): void {
  const { start, end } = span;
  const limitEnd = start + rules.restPaidUpToMinutes * 60;
  if (end > limitEnd) judged.warnings.push({ code: "rest-long", start, end });
  const isMealLong = end - start >= rules.mealUnpaidFromMinutes * 60;
  const isCut = end > limitEnd && (rules.restLimitAnnounced || isMealLong);
  const paidEnd = isCut ? limitEnd : end;
  if (paidEnd > start) {
    judged.paid.push(paidOf({ ...span, end: paidEnd }));
    judged.steps.push({ rule: "rest-paid", start, end: paidEnd });
  }
  if (isCut) judged.steps.push({ rule: "rest-unpaid", start: paidEnd, end });
}

function judgeMeal(span: Span, rules: BreakRules, judged: JudgedShift): void {
  const { start, end } = span;
  const isMeal = end - start >= rules.mealUnpaidFromMinutes * 60;
  if (!isMeal) judged.paid.push(paidOf(span));
  judged.steps.push({ rule: isMeal ? "meal-unpaid" : "meal-paid", start, end });
  if (!isMeal) judged.warnings.push({ code: "meal-short", start, end });
  const isLong = isMeal && end - start > rules.mealAtMostMinutes * 60;
  if (isLong) judged.warnings.push({ code: "meal-long", start, end });
}

function paidOf({ start, end, rate }: Span): Paid {
  return { start, end, rate };
}
