import { z } from "zod";
import { instant } from "@/lib/ledger/schema";
import { buckets } from "@/lib/pay/schema";

const seconds = z.number().int().min(0);

const sums = {
  paidSeconds: seconds,
  buckets: z.record(z.enum(buckets), seconds),
  /** By the premium's code. */
  premiums: z.record(z.string(), seconds),
};

/** Why a day's seconds are what they are, one entry a step. */
const trailStep = z.object({
  rule: z.string(),
  /** Below 0 only where rounding took time away. */
  seconds: z.number().int(),
  text: z.string(),
});
export type TrailStep = z.infer<typeof trailStep>;

const payDay = z.object({
  date: z.iso.date(),
  /** Before rounding. */
  workedSeconds: seconds,
  ...sums,
  trail: z.array(trailStep),
});
export type PayDay = z.infer<typeof payDay>;

const totals = z.object(sums);
export type PayTotals = z.infer<typeof totals>;

const money = z.string();

/** Only where rates or extras were given. */
const weekPay = z.object({
  straightTime: money,
  extras: money,
  regularRate: money.nullable(),
  overtimePremium: money,
  total: money,
});

/** What POST /api/v1/calculate/pay answers: workweeks and days with time, in order. */
export const payAnswer = z.object({
  workweeks: z.array(
    z.object({
      start: instant,
      end: instant,
      days: z.array(payDay),
      totals,
      pay: weekPay.optional(),
    }),
  ),
  totals,
  warnings: z.array(z.object({ code: z.string(), date: z.iso.date(), text: z.string() })),
});
export type PayAnswer = z.infer<typeof payAnswer>;
