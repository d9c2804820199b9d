import { z } from "zod";
import { instant, workerNumber } from "@/lib/ledger/schema";
import { buckets } from "@/lib/pay/schema";

/** The layout that files are written in; another one is another number, and old files stay. */
export const FILE_LAYOUT = 1;

export const fileFormats = ["csv", "json", "xlsx"] as const;
export type FileFormat = (typeof fileFormats)[number];

const wholeSeconds = z.number().int();
const hours = z.string();

/** Seconds as they are, and decimal hours rounded once, so that columns add up. */
const figures = z.object({
  workedSeconds: wholeSeconds,
  paidSeconds: wholeSeconds,
  buckets: z.record(z.enum(buckets), wholeSeconds),
  premiums: z.record(z.string(), wholeSeconds),
  hours: z.object({
    worked: hours,
    paid: hours,
    regular: hours,
    overtime: hours,
    double: hours,
    premiums: z.record(z.string(), hours),
  }),
});

/** What stands beside a file, so that it can be checked against what a payroll office took in. */
export const fileTotals = figures.extend({
  /** People with hours or an adjustment. */
  headcount: z.number().int(),
  /** Frozen with a question open: with all tapped time, as nobody goes unpaid for it. */
  closedWithQuestions: z.array(
    z.object({ worker: workerNumber, name: z.string(), reason: z.string() }),
  ),
  /** People who work here and have no hours in the period. */
  withoutHours: z.array(z.object({ worker: workerNumber, name: z.string() })),
});
export type FileTotals = z.infer<typeof fileTotals>;

const day = figures.extend({
  workweek: z.iso.date(),
  date: z.iso.date(),
  policy: z.string(),
});
export type FileDay = z.infer<typeof day>;

/** The change of a day that an earlier period paid; with signs. */
const adjustment = day.extend({ reference: z.string(), period: z.uuid() });

const person = figures.extend({
  worker: workerNumber,
  name: z.string(),
  payrollNumber: z.string().nullable(),
  cell: z.string(),
  /** Why the card was closed with questions open; null where none was. */
  closedWithQuestions: z.string().nullable(),
  days: z.array(day),
  adjustments: z.array(adjustment),
});
export type FilePerson = z.infer<typeof person>;

/** A closed period's hours: what every format is written from, and the JSON format itself. */
export const payFile = z.object({
  layout: z.literal(FILE_LAYOUT),
  site: z.string(),
  period: z.object({ id: z.uuid(), from: z.iso.date(), to: z.iso.date() }),
  revision: z.number().int().min(1),
  closedAt: instant,
  closedBy: z.string(),
  /** SHA-256 of the frozen rows, in hex. */
  digest: z.string(),
  people: z.array(person),
  totals: fileTotals,
});
export type PayFile = z.infer<typeof payFile>;
