import { z } from "zod";
import { cursor } from "@/lib/api/cursor";
import { filterName, page, pageLimit } from "@/lib/api/page";
import { bookedSegment } from "@/lib/api/segments";
import { afterSeq } from "@/lib/forms";
import { kioskTicket, ticketOperation } from "@/lib/kiosks/schema";
import { instant } from "@/lib/ledger/schema";

const { ticket, model, options, quantity, status, dueOn } = kioskTicket.shape;

/** GET /api/v1/tickets: all filters may be left out; `cell` is where the next operation is. */
export const ticketsQuery = z.strictObject({
  status: status.optional(),
  cell: filterName.optional(),
  model: filterName.optional(),
  cursor: cursor(afterSeq).optional(),
  limit: pageLimit,
});

/** A ticket in the list: the next operation and its cell are null once nothing is left to do. */
export const ticketSummary = z.object({
  ticket,
  status,
  model,
  options,
  order: z.string().nullable(),
  quantity,
  dueOn,
  operation: z.string().nullable(),
  operationName: z.string().nullable(),
  stage: z.string().nullable(),
  cell: z.string().nullable(),
  createdAt: instant,
  finishedAt: instant.nullable(),
});
export type TicketSummary = z.infer<typeof ticketSummary>;

export const ticketPage = page(ticketSummary);

const { operation, state, openQuantity, setupSeconds, runSeconds, actualSeconds, ...op } =
  ticketOperation.shape;

/** An operation of a birth record; its two sides are in person-seconds. */
export const recordedOperation = z.object({
  operation,
  name: op.name,
  stage: op.stage,
  cell: op.cell,
  state,
  quantity: op.quantity,
  openQuantity,
  good: op.good,
  rework: op.rework,
  scrap: op.scrap,
  setupSeconds,
  runSeconds,
  /** Setup once and run for the whole quantity; null where no standard is set. */
  standardSeconds: setupSeconds,
  /** All time booked to it that has ended: the sum of its segments below. */
  actualSeconds,
  firstWorkAt: instant.nullable(),
  finishedAt: instant.nullable(),
});

/** A count that stands; the person is named only to those who may know. */
export const recordedReport = z.object({
  kind: z.enum(["report", "inspect"]),
  at: instant,
  operation,
  good: op.good,
  rework: op.rework,
  scrap: op.scrap,
  stop: z.boolean(),
  causedBy: z.string().nullable(),
  defects: z.array(z.string()),
  cell: z.string().nullable(),
  worker: bookedSegment.shape.worker,
});

/** GET /api/v1/tickets/{code}: the whole life of one ticket, in the order in which it happened. */
export const birthRecord = ticketSummary.extend({
  operations: z.array(recordedOperation),
  segments: z.array(bookedSegment),
  reports: z.array(recordedReport),
});
export type BirthRecord = z.infer<typeof birthRecord>;
