import { z } from "zod";
import { cursor } from "@/lib/api/cursor";
import { formId, line } from "@/lib/forms";
import { looseEndCode, workerNumber } from "@/lib/ledger/schema";

/** Where a page of loose ends ended: rank, instant in epoch milliseconds, code and subject. */
const endPosition = z.tuple([
  z.number().int(),
  z.number().int(),
  z.string().max(40),
  z.string().max(300),
]);
export type EndPosition = z.infer<typeof endPosition>;

/** What the address says of the list; anything odd in it counts as not said. */
export const endsFilter = z.object({
  cell: z.string().max(200).catch(""),
  code: looseEndCode.or(z.literal("")).catch(""),
  /** The key of the one that is open. */
  open: z.string().max(340).catch(""),
  after: cursor(endPosition).optional().catch(undefined),
});

/** A local date and time as a field sends it; empty where none was told. */
export const localTime = z
  .string()
  .regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2})?$/, "Give a date and a time.")
  .or(z.literal(""));

/** An answer to a loose end. */
export const settleForm = z.strictObject({
  id: formId,
  code: looseEndCode,
  subject: z.string().min(1).max(300),
  answer: z.string().min(1).max(120),
  time: localTime.default(""),
  worker: workerNumber.or(z.literal("")).default(""),
  reason: line(300),
});
export type SettleForm = z.infer<typeof settleForm>;
