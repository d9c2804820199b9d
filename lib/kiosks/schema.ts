import { z } from "zod";
import { role } from "@/lib/access/roles";
import { languages } from "@/lib/kiosks/languages";
import { activity, instant, looseEndCode, verdict, workerNumber } from "@/lib/ledger/schema";
import { operationSheet } from "@/lib/sheet/schema";

/** One of the languages in which a kiosk speaks. */
export const language = z.enum(languages);

const seconds = z.number().int().min(0);

/** The public half of the key with which a kiosk seals credentials (LEDGER.md 9). */
const sealKey = z.object({ kid: z.string(), key: z.string() });
export type SealKey = z.infer<typeof sealKey>;

// POST /api/kiosk/enrol ---------------------------------------------------------------------------
export const enrolRequest = z.strictObject({
  code: z
    .string()
    .max(32)
    .transform((text) => text.replace(/[\s-]/g, "").toUpperCase()),
});
export const enrolled = z.object({
  deviceId: z.uuid(),
  name: z.string(),
  cell: z.string(),
  site: z.object({ id: z.uuid(), name: z.string(), timeZone: z.string(), locale: z.string() }),
  sealKey,
  serverTime: instant,
});
export type Enrolled = z.infer<typeof enrolled>;

// GET /api/kiosk/time -----------------------------------------------------------------------------
export const timeQuery = z.object({
  build: z
    .string()
    .regex(/^[\w.+-]{1,64}$/, "Give the id of a build.")
    .optional(),
  queued: z.coerce.number().int().min(0).max(1_000_000).optional(),
  battery: z.coerce.number().min(0).max(100).optional(),
});
export const kioskTime = z.object({ serverTime: instant, build: z.string(), sealKey });
export type KioskTime = z.infer<typeof kioskTime>;

// POST /api/kiosk/sign-in -------------------------------------------------------------------------
export const signInRequest = z.strictObject({
  session: z.uuid(),
  worker: workerNumber,
  pin: z.string().regex(/^\d{1,12}$/, "Give the PIN, digits only."),
});
const signedInWorker = z.object({
  worker: workerNumber,
  name: z.string(),
  language: z.string(),
  role,
});

// Tickets -----------------------------------------------------------------------------------------
/** What stands in the way of an operation, in the order in which a person would want to hear it. */
const obstacle = z.enum(["wrong-cell", "finished", "predecessor-open", "ticket-closed"]);
export type Obstacle = z.infer<typeof obstacle>;

export const ticketOperation = z.object({
  /** The operation's code, such as "120"; what an event names. */
  operation: z.string(),
  name: z.string(),
  stage: z.string(),
  cell: z.string(),
  state: z.enum(["waiting", "ready", "working", "finished", "closed"]),
  /** Standards in person-seconds: per setup, per piece; null where none is set. */
  setupSeconds: seconds.nullable(),
  runSeconds: seconds.nullable(),
  setupEarned: z.boolean(),
  quantity: seconds,
  openQuantity: seconds,
  good: seconds,
  rework: seconds,
  scrap: seconds,
  /** All time ever booked to it, until now. */
  actualSeconds: seconds,
  /** Names of the people who are on it now. */
  workers: z.array(z.object({ worker: workerNumber, name: z.string() })),
  /** True where it is this kiosk's cell. */
  here: z.boolean(),
  obstacles: z.array(obstacle),
  hazards: z.array(z.string()),
  holds: z.array(z.object({ hold: z.string(), until: instant.nullable() })),
  qualification: z.string().nullable(),
  /** Only where the operation is built in steps. */
  sheet: operationSheet.optional(),
});
export type TicketOperation = z.infer<typeof ticketOperation>;

// GET /api/kiosk/tickets/{code} -------------------------------------------------------------------
export const kioskTicket = z.object({
  ticket: z.string(),
  model: z.string(),
  options: z.array(z.string()),
  quantity: seconds,
  status: z.enum(["open", "finished", "scrapped", "cancelled"]),
  dueOn: z.string().nullable(),
  operations: z.array(ticketOperation),
});
export type KioskTicket = z.infer<typeof kioskTicket>;

// GET /api/kiosk/bench ----------------------------------------------------------------------------
/** A lead may look at the bench of somebody of the own cells. */
export const benchQuery = z.strictObject({ worker: workerNumber.optional() });

/** A ticket operation someone is on, with what the bench must say of it. */
const benchItem = z.object({
  ticket: z.string(),
  operation: z.string(),
  weight: seconds,
  model: z.string(),
  options: z.array(z.string()),
  name: z.string(),
  quantity: seconds,
  openQuantity: seconds,
  good: seconds,
  setupSeconds: seconds.nullable(),
  runSeconds: seconds.nullable(),
  /** All time booked to it by anyone before the current interval of this worker. */
  bookedSeconds: seconds,
  hazards: z.array(z.string()),
});
export type BenchItem = z.infer<typeof benchItem>;

/** Today's seconds by what they were, for a production day that ends now. */
const daySums = z.object({
  attendanceSeconds: seconds,
  directSeconds: seconds,
  indirectSeconds: seconds,
  restSeconds: seconds,
  mealSeconds: seconds,
  unassignedSeconds: seconds,
});
export type DaySums = z.infer<typeof daySums>;

/** One event as the fold reads it, in the form in which it travels to the kiosk. */
const foldedEvent = z.object({
  id: z.uuid(),
  atMs: z.number(),
  seq: z.number(),
  kiosk: z.string().nullable(),
  session: z.string(),
  cell: z.string().nullable(),
  by: z.string().nullable(),
  receivedMs: z.number().nullable(),
  weights: z.array(z.number()),
  questions: z.array(looseEndCode),
  body: z.object({ kind: z.string() }).loose(),
});

const looseEndView = z.object({ code: looseEndCode, subject: z.string(), at: instant });

export const bench = z.object({
  shift: z.object({ start: instant }).nullable(),
  work: z
    .object({ activity, items: z.array(benchItem), since: instant, said: z.boolean() })
    .nullable(),
  other: z.object({ code: z.string(), since: instant }).nullable(),
  break: z.enum(["meal", "rest"]).nullable(),
  /** When the current break began; null where there is none. */
  breakSince: instant.nullable(),
  today: daySums,
  /** What others altered in this worker's time since it was last shown. */
  changes: z.array(z.object({ kind: z.string(), at: instant, by: z.string(), note: z.string() })),
  looseEnds: z.array(looseEndView),
  /** Every event of the open window, for the same fold on the kiosk. */
  events: z.array(foldedEvent),
  /** The shift planned for today, if any. */
  planned: z.object({ start: instant, end: instant }).nullable(),
  /** Tickets that this cell could take next, likeliest first. */
  next: z.array(
    z.object({
      ticket: z.string(),
      operation: z.string(),
      name: z.string(),
      model: z.string(),
      options: z.array(z.string()),
      quantity: seconds,
      openQuantity: seconds,
      dueOn: z.string().nullable(),
    }),
  ),
});
export type Bench = z.infer<typeof bench>;

export const signedIn = z.object({ token: z.string(), worker: signedInWorker, bench });
export type SignedIn = z.infer<typeof signedIn>;

// GET /api/kiosk/cell -----------------------------------------------------------------------------
/** What a kiosk keeps of its cells: no PIN material, nothing of other cells. */
export const kioskCell = z.object({
  kiosk: z.object({ deviceId: z.uuid(), name: z.string() }),
  site: z.object({ id: z.uuid(), name: z.string(), timeZone: z.string(), locale: z.string() }),
  cells: z.array(z.string()),
  rules: z.object({
    timeZone: z.string(),
    productionDayStartsAtMinutes: z.number().int(),
    shiftLimitSeconds: seconds,
    sinceLimitSeconds: seconds,
    restMaxSeconds: seconds,
    mealMaxSeconds: seconds,
    restBetweenShiftsSeconds: seconds,
  }),
  people: z.array(
    z.object({
      worker: workerNumber,
      name: z.string(),
      language: z.string(),
      homeHere: z.boolean(),
      inSince: instant.nullable(),
      qualifications: z.array(z.string()),
    }),
  ),
  /** Tickets whose next operation is here, in due order, whole, so that a scan needs no request. */
  tickets: z.array(kioskTicket),
  queue: z.array(z.object({ ticket: z.string(), operation: z.string() })),
  otherWork: z.array(z.string()),
  notes: z.array(z.object({ at: instant, text: z.string() })),
});
export type KioskCell = z.infer<typeof kioskCell>;

// POST /api/kiosk/events --------------------------------------------------------------------------
const eventResult = z.object({
  id: z.string(),
  verdict,
  looseEnds: z.array(looseEndCode),
  bench: bench.optional(),
});
export type EventResult = z.infer<typeof eventResult>;
export const eventResults = z.object({ results: z.array(eventResult), serverTime: instant });
export type EventResults = z.infer<typeof eventResults>;
