import { z } from "zod";
import { isInstant } from "@/lib/time/instant";

/** The most events a batch may carry (API.md). */
export const BATCH_MAX = 500;
/** The most tickets one person may work on at once (CALCULATIONS.md 1). */
export const ITEMS_MAX = 200;
const QUANTITY_MAX = 10_000;
const NOTE_MAX = 500;

/** An RFC 3339 instant, kept as it was spelled; `instantMs` reads it. */
export const instant = z
  .string()
  .max(64)
  .refine(isInstant, "Give an RFC 3339 instant with an offset, such as 2026-05-14T09:42:00Z.")
  .meta({ format: "date-time" });

/** A worker's number as the badge shows it: digits only, kept as text. */
export const workerNumber = z.string().regex(/^\d{1,8}$/, "Give the worker's number, digits only.");

/** A ticket number: spaces and hyphens are forgiven, digits are kept. */
const ticketNumber = z
  .string()
  .max(24)
  .transform((text) => text.replace(/[\s-]/g, ""))
  .pipe(z.string().regex(/^\d{4,15}$/, "Give the ticket's number, digits only."));

const operationCode = z.string().min(1).max(64);
const code = z.string().min(1).max(64);
const count = z.number().int().min(0).max(QUANTITY_MAX);

/** One ticket operation someone is on; the weight is in whole seconds (CALCULATIONS.md 2). */
const item = z.strictObject({
  ticket: ticketNumber,
  operation: operationCode,
  weight: z.number().int().min(0).max(1_000_000_000).optional(),
});
export type Item = z.infer<typeof item>;

const items = z.array(item).min(1).max(ITEMS_MAX);

/** The four ways to work on a ticket operation. */
export const activity = z.enum(["setup", "run", "rework", "inspect"]);
export type Activity = z.infer<typeof activity>;

const counts = {
  ticket: ticketNumber,
  operation: operationCode,
  good: count,
  rework: count,
  scrap: count,
  causedBy: operationCode.optional(),
  defects: z.array(code).max(20).optional(),
};

const step = { ticket: ticketNumber, operation: operationCode, step: code };

/** The body of each kind of event: LEDGER.md 3. */
export const eventBodies = {
  "shift-start": z.strictObject({}),
  "shift-end": z.strictObject({}),
  "break-start": z.strictObject({ break: z.enum(["meal", "rest"]) }),
  "break-end": z.strictObject({ break: z.enum(["meal", "rest"]) }),
  work: z.strictObject({ activity, items, since: instant.optional() }),
  indirect: z.strictObject({ code, since: instant.optional() }),
  pause: z.strictObject({ items }),
  report: z.strictObject({ ...counts, stop: z.boolean() }),
  inspect: z.strictObject(counts),
  reassign: z.strictObject({
    event: z.uuid(),
    activity: activity.optional(),
    items: items.optional(),
    code: code.optional(),
  }),
  "step-done": z.strictObject(step),
  "step-open": z.strictObject(step),
  "step-skip": z.strictObject(step),
  "hand-over": z.strictObject({ ticket: ticketNumber, operation: operationCode, to: workerNumber }),
  reading: z.strictObject({
    ticket: ticketNumber,
    operation: operationCode,
    name: code,
    value: z.number(),
  }),
  "caution-read": z.strictObject({ operation: operationCode, version: z.string().min(1).max(64) }),
  undo: z.strictObject({ event: z.uuid() }),
  object: z.strictObject({ subject: z.string().min(1).max(200) }),
  confirm: z.strictObject({ subject: z.string().min(1).max(200) }),
  settle: z.strictObject({ end: z.string().min(1).max(300), answer: z.string().min(1).max(200) }),
  void: z.strictObject({ event: z.uuid() }),
  move: z.strictObject({ event: z.uuid(), to: instant }),
  insert: z.strictObject({ event: z.looseObject({ kind: z.string() }) }),
  release: z.strictObject({ hold: z.string().min(1).max(200) }),
} as const;

type EventKind = keyof typeof eventBodies;
type Shape<K extends EventKind> = (typeof eventBodies)[K] extends z.ZodObject<infer S> ? S : never;
export type EventBody = {
  [K in EventKind]: z.infer<z.ZodObject<{ kind: z.ZodLiteral<K> } & Shape<K>>>;
}[EventKind];

/** What the tablet knows of its own clock at the act: `offsetMs` is server − tablet (LEDGER.md 2). */
const clock = z.strictObject({
  offsetMs: z.number().int().nullable(),
  uncertaintyMs: z.number().int().min(0).nullable(),
  boot: z.string().min(1).max(64),
  monotonicMs: z.number().min(0),
  seq: z.number().int().min(0),
});
export type Clock = z.infer<typeof clock>;

/** What every event carries beside its body. */
const head = {
  id: z.uuid(),
  v: z.literal(1),
  session: z.uuid(),
  worker: workerNumber,
  at: instant,
  clock,
  by: workerNumber.optional(),
  note: z.string().max(NOTE_MAX).optional(),
};

const kinds = Object.keys(eventBodies) as EventKind[];

type Head = z.infer<z.ZodObject<typeof head>>;
/** One event of the ledger in the form in which it travels. */
export type ClockEvent = Head & EventBody;

/** One event as a kiosk sends it; unknown fields and kinds are refused, and kept as `unreadable`. */
export const clockEvent = z.discriminatedUnion(
  "kind",
  // safe because the list of kinds is not empty, which is all that the tuple type asks
  kinds.map((kind) =>
    z.strictObject({ ...head, kind: z.literal(kind), ...eventBodies[kind].shape }),
  ) as unknown as [z.ZodObject, ...z.ZodObject[]],
) as unknown as z.ZodType<ClockEvent>;

/** The envelope of a kiosk's batch: each event is read by itself, so one bad record costs no other. */
export const eventBatch = z.strictObject({
  events: z.array(z.unknown()).min(1).max(BATCH_MAX),
  sessions: z
    .array(
      z.strictObject({ session: z.uuid(), worker: workerNumber, sealed: z.string().max(2000) }),
    )
    .max(BATCH_MAX)
    .optional(),
  deviceTime: instant,
});
export type EventBatch = z.infer<typeof eventBatch>;

/** LEDGER.md 6: kept and not counted until settled. */
export const keptCodes = [
  "unreadable",
  "id-clash",
  "unknown-worker",
  "unproved",
  "revoked",
  "future",
] as const;

/** LEDGER.md 6: booked, with a question. */
export const questionCodes = [
  "no-shift-end",
  "implied-start",
  "already-in",
  "two-kiosks",
  "break-long",
  "break-open",
  "shift-long",
  "rest-short",
  "session-late",
  "since-outside",
  "undo-late",
  "clock-unmeasured",
  "unknown-ticket",
  "out-of-order",
  "on-hold",
  "no-qualification",
  "over-count",
  "count-without-work",
  "past-finish",
  "wrong-cell",
  "ticket-scrapped",
  "objection",
  "deduction-unattested",
] as const;

export const looseEndCode = z.enum([...keptCodes, ...questionCodes]);
export type LooseEndCode = z.infer<typeof looseEndCode>;

export const verdict = z.enum(["booked", "duplicate", "looseEnd"]);
export type Verdict = z.infer<typeof verdict>;
