import { z } from "zod";
import { weekdays } from "@/lib/time/workweek";

const localTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, "Give a local time as HH:MM.");
const minutes = z.number().int().min(0).max(1440);

/** How an hour is paid; a later one is the higher. */
export const buckets = ["regular", "overtime", "double"] as const;
export type Bucket = (typeof buckets)[number];

const tiers = z
  .array(
    z.strictObject({
      overHours: z.number().min(0).max(168),
      bucket: z.enum(["overtime", "double"]),
    }),
  )
  .max(10)
  .default([]);
export type Tier = z.output<typeof tiers>[number];

const breakRules = z
  .strictObject({
    restPaidUpToMinutes: minutes.default(20),
    /** True where the policy announced the limit: then only the excess of a long rest is unpaid. */
    restLimitAnnounced: z.boolean().default(false),
    mealUnpaidFromMinutes: minutes.default(30),
    mealAtMostMinutes: minutes.default(75),
  })
  .refine((rules) => rules.mealAtMostMinutes >= rules.mealUnpaidFromMinutes, {
    path: ["mealAtMostMinutes"],
    message: "Give at least as much as `mealUnpaidFromMinutes`.",
  });
export type BreakRules = z.output<typeof breakRules>;

/**
 * Hours that carry more: a window in local time on the days on which it opens (`to` not after `from`
 * closes on the next day), and whole listed dates. Days left out are all of them, unless only dates
 * are given.
 */
const premium = z.strictObject({
  code: z.string().regex(/^[\w-]{1,64}$/, "Give a code of letters, digits and hyphens."),
  from: localTime.optional(),
  to: z.union([localTime, z.literal("24:00")], "Give a local time as HH:MM.").optional(),
  days: z.array(z.enum(weekdays)).max(7).optional(),
  dates: z.array(z.iso.date()).max(366).default([]),
});
export type Premium = z.output<typeof premium>;

const rounding = z.discriminatedUnion("mode", [
  z.strictObject({ mode: z.literal("none") }),
  z.strictObject({
    mode: z.literal("nearest"),
    minutes: z.union(
      [z.literal(5), z.literal(6), z.literal(10), z.literal(15)],
      "Give 5, 6, 10 or 15.",
    ),
  }),
]);
export type Rounding = z.output<typeof rounding>;

/** A pay policy; what is left out is as in CALCULATIONS.md 4. */
export const payPolicy = z.strictObject({
  workweek: z
    .strictObject({
      startsOn: z.enum(weekdays).default("monday"),
      at: localTime.default("00:00"),
    })
    .prefault({}),
  attribution: z.enum(["calendar-day", "shift-start"]).default("calendar-day"),
  newShiftAfterMinutes: minutes.min(1).default(240),
  rounding: rounding.default({ mode: "none" }),
  breaks: breakRules.prefault({}),
  overtime: z.strictObject({ daily: tiers, weekly: tiers, seventhDay: tiers }).prefault({}),
  premiums: z.array(premium).max(50).default([]),
  /** Over which hours a flat sum is spread for the regular rate. */
  flatSum: z.enum(["all-hours", "regular-hours"]).default("all-hours"),
  /** Whose limits warn beside those that always do. */
  limits: z.enum(["none", "us-california", "eu-working-time"]).default("none"),
});
export type PayPolicy = z.output<typeof payPolicy>;

export const presetName = z.enum(["us-federal", "us-california", "eu-working-time", "straight"]);
export type PresetName = z.infer<typeof presetName>;
