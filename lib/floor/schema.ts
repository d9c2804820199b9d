import { z } from "zod";
import { activity } from "@/lib/ledger/schema";

const seconds = z.number().int().min(0);
/** An instant in epoch seconds. */
const second = z.number().int();

/** Someone who is in, and since when they are on what they are on. */
const present = z.object({ worker: z.string(), name: z.string(), since: second });

/**
 * Someone on a ticket operation: their interval since `since` is shared by `weights`, and this
 * operation has the share at `share`.
 */
const presentOnWork = present.extend({
  activity,
  weights: z.array(seconds),
  share: z.number().int().min(0),
});

/** A ticket operation that someone is on now, whoever and how many. */
const floorWork = z.object({
  ticket: z.string(),
  operation: z.string(),
  name: z.string(),
  model: z.string(),
  options: z.array(z.string()),
  quantity: seconds.nullable(),
  /** Standard for all its pieces, in person-seconds; null where none is set. */
  standardSeconds: seconds.nullable(),
  /** All time booked to it that has ended. */
  bookedSeconds: seconds,
  people: z.array(presentOnWork),
});
export type FloorWork = z.infer<typeof floorWork>;

/** Someone who is in but on no ticket. */
const presentElsewhere = present.extend({
  doing: z.enum(["indirect", "meal", "rest", "unassigned"]),
  /** The other-work code of indirect time. */
  code: z.string().nullable(),
});
export type PresentElsewhere = z.infer<typeof presentElsewhere>;

/** Someone planned to be in now who is not. */
const missing = z.object({ worker: z.string(), name: z.string(), plannedAt: second });

const floorCell = z.object({
  cell: z.string(),
  inCount: z.number().int(),
  work: z.array(floorWork),
  elsewhere: z.array(presentElsewhere),
  missing: z.array(missing),
});
export type FloorCell = z.infer<typeof floorCell>;

/** Who is on what, now. It holds instants, not lengths, so it changes only when someone taps. */
export const floorView = z.object({
  timeZone: z.string(),
  cells: z.array(floorCell),
  /** The next planned start, for a floor that nobody is on. */
  opensAt: second.nullable(),
});
export type FloorView = z.infer<typeof floorView>;
