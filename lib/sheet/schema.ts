import { z } from "zod";
import { instant, workerNumber } from "@/lib/ledger/schema";

const seconds = z.number().int().min(0);

const sheetStep = z.object({
  step: z.string(),
  name: z.string(),
  /** What it takes against the other steps: its weight in a bunch. */
  seconds,
  /** Its part of the operation's standard; null where none is set. */
  standardSeconds: seconds.nullable(),
  state: z.enum(["open", "done", "skipped"]),
  actualSeconds: seconds,
  /** True where its time was shared out among steps tapped off together. */
  together: z.boolean(),
  at: instant.nullable(),
  reason: z.string().nullable(),
});

const stepTap = z.object({
  event: z.string(),
  kind: z.enum(["done", "open", "skip"]),
  step: z.string(),
  worker: workerNumber,
  atMs: z.number(),
  weight: seconds,
  reason: z.string().nullable(),
});

/** A piece of somebody's time on the operation, epoch seconds; while it runs, what shares it. */
const timePiece = z.object({
  worker: workerNumber,
  start: z.number().int(),
  end: z.number().int().nullable(),
  /** Its fair share; null while it runs. */
  seconds: seconds.nullable(),
  /** Of all items of what runs, and which of them it is. */
  weights: z.array(z.number().int().min(0)),
  item: z.number().int().min(0),
});
export type TimePiece = z.infer<typeof timePiece>;

/**
 * The sheet of a ticket operation that is built in steps: `steps` and `notTappedSeconds` sum to the
 * operation's actual; `taps` and `time` are what they follow from, so that a kiosk can go on alone.
 */
export const operationSheet = z.object({
  steps: z.array(sheetStep),
  notTappedSeconds: seconds,
  taps: z.array(stepTap),
  time: z.array(timePiece),
  /** Given to a colleague who has not begun on it; null where it is not. */
  handOver: z
    .object({
      event: z.string(),
      from: workerNumber,
      to: workerNumber,
      atMs: z.number(),
      reason: z.string().nullable(),
    })
    .nullable(),
});
export type OperationSheet = z.infer<typeof operationSheet>;
