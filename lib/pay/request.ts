import { z } from "zod";
import { instant } from "@/lib/ledger/schema";
import { policyOf } from "@/lib/pay/presets";
import { payPolicy, presetName } from "@/lib/pay/schema";
import { instantMs } from "@/lib/time/instant";
import { siteDate } from "@/lib/time/schema";
import { addDays } from "@/lib/time/site-day";
import { workweekStart } from "@/lib/time/workweek";
import { isTimeZone } from "@/lib/time/zone";

/** A year and a half: a range that needs more is several. */
const DAYS_MAX = 550;
const DAY_MS = 86_400_000;
/** Longer than any shift; what is longer is a mistake in the data. */
const SPAN_MAX_MS = 31 * DAY_MS;
/** The longest range, and as much again for the weeks that averages look back at. */
const TIME_MAX_MS = 2 * DAYS_MAX * DAY_MS;
/** Six a day over the longest range, with room to spare. */
const SPANS_MAX = 5000;

const decimal = z
  .string()
  .regex(/^\d{1,9}(\.\d{1,6})?$/, 'Give a decimal as text, such as "14.25".');

const span = z.strictObject({
  start: instant,
  end: instant,
  kind: z.enum(["work", "rest", "meal"]),
  /** Per hour; a break without one takes that of the work before it, else after. */
  rate: decimal.optional(),
});

const extra = z.strictObject({
  /** The date on which the workweek begins. */
  workweek: siteDate,
  amount: decimal,
  kind: z.enum(["ordinary", "flat-sum", "creditable", "excluded"]).default("ordinary"),
});

const fields = z.strictObject({
  timeZone: z.string().max(64).refine(isTimeZone, "Give an IANA time zone, such as Europe/Madrid."),
  from: siteDate,
  to: siteDate,
  policy: z.union([presetName, payPolicy], {
    error: `Give a policy, or one of: ${presetName.options.join(", ")}.`,
  }),
  spans: z.array(span).max(SPANS_MAX),
  extras: z.array(extra).max(1000).default([]),
});
type Fields = z.output<typeof fields>;
type Complain = (path: (string | number)[], message: string) => void;

/**
 * POST /api/v1/calculate/pay. Beyond its fields: `to` is after `from`, every span ends after it
 * starts, none overlaps another, all work carries a rate or none does, and an extra names a
 * workweek of the range.
 */
export const payRequest = fields.superRefine((request, context) => {
  if (context.issues.length > 0) return; // what could not be read cannot be compared
  const complain: Complain = (path, message) => context.addIssue({ code: "custom", path, message });
  checkRange(request, complain);
  checkSpans(request, complain);
  checkRates(request, complain);
  checkExtras(request, complain);
});
export type PayRequest = z.output<typeof payRequest>;

function checkRange({ from, to }: Fields, complain: Complain): void {
  if (to <= from) complain(["to"], "Give a `to` after `from`: it is exclusive.");
  else if (to > addDays(from, DAYS_MAX)) complain(["to"], `Ask for at most ${DAYS_MAX} days.`);
}

function checkSpans({ spans }: Fields, complain: Complain): void {
  const timed = spans.map(({ start, end }, index) => ({
    index,
    // safe because the schema of an instant has read both
    startMs: instantMs(start)!,
    endMs: instantMs(end)!,
  }));
  for (const { index, startMs, endMs } of timed) {
    const isKnown = startMs >= 0 && endMs < Date.UTC(2200, 0);
    if (endMs <= startMs) complain(["spans", index], "A span ends after it starts.");
    else if (endMs - startMs > SPAN_MAX_MS)
      complain(["spans", index], "Give spans of at most 31 days.");
    else if (!isKnown) complain(["spans", index], "Give instants from 1970 to 2199.");
  }
  const inOrder = timed.toSorted((a, b) => a.startMs - b.startMs);
  const [first, last] = [inOrder[0], inOrder.at(-1)];
  const isFar = first && last && last.startMs - first.startMs > TIME_MAX_MS;
  if (isFar) complain(["spans", last.index], "Give the time of at most three years at once.");
  inOrder.forEach(({ index, startMs }, place) => {
    const before = inOrder[place - 1];
    if (!before || startMs >= before.endMs) return;
    complain(["spans", index], `This span overlaps spans.${before.index}: they may only touch.`);
  });
}

function checkRates({ spans }: Fields, complain: Complain): void {
  const isRated = spans.some(({ rate }) => rate !== undefined);
  spans.forEach(({ kind, rate }, index) => {
    const isMissing = isRated && kind === "work" && rate === undefined;
    if (isMissing) complain(["spans", index, "rate"], "All work carries a rate, or none does.");
  });
}

function checkExtras({ policy, from, to, extras }: Fields, complain: Complain): void {
  const { startsOn } = policyOf(policy).workweek;
  extras.forEach(({ workweek }, index) => {
    const isStart = workweekStart(workweek, startsOn) === workweek;
    const isInRange = workweek < to && addDays(workweek, 7) > from;
    if (isStart && isInRange) return;
    const message = `Name a workweek of the range by the ${startsOn} on which it begins.`;
    complain(["extras", index, "workweek"], message);
  });
}
