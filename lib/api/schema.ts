import { z } from "zod";
import { cellsAnswer, operationsAnswer } from "@/lib/analytics/schema";
import { segmentPage } from "@/lib/api/segments";
import { splitAnswer } from "@/lib/api/split";
import { birthRecord, ticketPage } from "@/lib/api/tickets";
import { codeReading } from "@/lib/codes/schema";
import {
  bench,
  enrolled,
  eventResults,
  kioskCell,
  kioskTicket,
  kioskTime,
  signedIn,
} from "@/lib/kiosks/schema";
import { instant } from "@/lib/ledger/schema";
import { payAnswer } from "@/lib/pay/answer";
import { payFile } from "@/lib/periods/file";
import { periodPage } from "@/lib/periods/schema";
import { standardItem, standardPage } from "@/lib/standards/schema";

/** RFC 9457, as every refusal is answered; `errors` names the fields of invalid input. */
const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});

/** GET /api/health: `ok` with 200, anything else with 503. */
export const health = z.object({
  status: z.enum(["ok", "unavailable"]),
  database: z.enum(["up", "down"]),
  /** The last migration by name (null: newer than this version), and whether it will do. */
  migrations: z.object({ applied: z.string().nullable(), isCurrent: z.boolean() }).nullable(),
  /** Marks that wait to be derived again; null if the database is down. */
  queueDepth: z.number().int().min(0).nullable(),
  /** Null where no backup was ever made. */
  lastBackupAt: instant.nullable(),
});
export type Health = z.infer<typeof health>;

/** What routes answer, by the name that the contract gives it. */
export const answers = {
  Problem: problem,
  Health: health,
  Contract: z.looseObject({ openapi: z.string() }),
  TicketPage: ticketPage,
  BirthRecord: birthRecord,
  SegmentPage: segmentPage,
  OperationsAnswer: operationsAnswer,
  CellsAnswer: cellsAnswer,
  StandardPage: standardPage,
  Standard: standardItem,
  Split: splitAnswer,
  CodeReading: codeReading,
  PayAnswer: payAnswer,
  PeriodPage: periodPage,
  PayFile: payFile,
  Enrolled: enrolled,
  KioskTime: kioskTime,
  KioskCell: kioskCell,
  SignedIn: signedIn,
  Bench: bench,
  KioskTicket: kioskTicket,
  EventResults: eventResults,
} as const satisfies Record<string, z.ZodType>;
