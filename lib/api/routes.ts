import type { z } from "zod";
import type { Action } from "@/lib/access/may";
import { cellsQuery, operationsQuery } from "@/lib/analytics/schema";
import type { answers } from "@/lib/api/schema";
import { segmentsQuery } from "@/lib/api/segments";
import { splitRequest } from "@/lib/api/split";
import { ticketsQuery } from "@/lib/api/tickets";
import { checkCodeRequest } from "@/lib/codes/schema";
import { benchQuery, enrolRequest, signInRequest, timeQuery } from "@/lib/kiosks/schema";
import { eventBatch } from "@/lib/ledger/schema";
import { payRequest } from "@/lib/pay/request";
import { exportQuery, periodsQuery } from "@/lib/periods/schema";
import { standardEntry, standardsListQuery } from "@/lib/standards/schema";

/** A route of the contract: who may call it, what it takes and gives. */
export interface ApiRoute {
  method: "get" | "post";
  /** With `{name}` for what varies; the folder under `app` has `[name]`. */
  path: string;
  name: string;
  summary: string;
  actor: "nobody" | "kiosk" | "worker" | "key";
  may?: Action;
  query?: z.ZodObject;
  body?: z.ZodType;
  answer: keyof typeof answers;
  /** Refusals beyond those that follow from the rest. */
  also?: Partial<Record<404 | 409 | 410 | 429, string>>;
  /** True where an `ETag` spares an answer that is known already. */
  unchanged?: true;
  /** When it answers 503, in its usual form. */
  unable?: string;
}

const kioskRoutes: ApiRoute[] = [
  {
    method: "post",
    path: "/api/kiosk/enrol",
    name: "enrolKiosk",
    summary: "Makes a browser a kiosk of a cell with a one-time code, and sets the device cookie.",
    actor: "nobody",
    body: enrolRequest,
    answer: "Enrolled",
    also: { 404: "No such code, or it is used or over.", 429: "Too many tries." },
  },
  {
    method: "get",
    path: "/api/kiosk/time",
    name: "readTime",
    summary:
      "Tells server time, build and the current seal key; keeps what the kiosk says of itself.",
    actor: "kiosk",
    query: timeQuery,
    answer: "KioskTime",
  },
  {
    method: "get",
    path: "/api/kiosk/cell",
    name: "readCell",
    summary: "Everything that the kiosk needs of its cells, offline too.",
    actor: "kiosk",
    answer: "KioskCell",
    unchanged: true,
  },
  {
    method: "post",
    path: "/api/kiosk/sign-in",
    name: "signIn",
    summary: "Opens a worker's session with number and PIN.",
    actor: "kiosk",
    body: signInRequest,
    answer: "SignedIn",
    also: { 429: "Too many wrong PINs: wait as long as `Retry-After` says." },
  },
  {
    method: "get",
    path: "/api/kiosk/bench",
    name: "readBench",
    summary: "What the worker is on, today's seconds, and the events of the open window.",
    actor: "worker",
    query: benchQuery,
    answer: "Bench",
  },
  {
    method: "get",
    path: "/api/kiosk/tickets/{code}",
    name: "readKioskTicket",
    summary: "A ticket as scanned or keyed, with its operations and what stands in their way.",
    actor: "worker",
    answer: "KioskTicket",
    also: { 404: "The code is right, but there is no such ticket here." },
  },
  {
    method: "post",
    path: "/api/kiosk/events",
    name: "bookEvents",
    summary: "Books a batch of up to 500 events and answers event by event, in the order sent.",
    actor: "kiosk",
    body: eventBatch,
    answer: "EventResults",
  },
];

const integrationRoutes: ApiRoute[] = [
  {
    method: "get",
    path: "/api/v1/tickets",
    name: "listTickets",
    summary: "Lists tickets in the order in which they were made.",
    actor: "key",
    may: "tickets.read",
    query: ticketsQuery,
    answer: "TicketPage",
  },
  {
    method: "get",
    path: "/api/v1/tickets/{code}",
    name: "readTicket",
    summary: "The birth record of a ticket: operations, segments and reports.",
    actor: "key",
    may: "tickets.read",
    answer: "BirthRecord",
    also: { 404: "The code is right, but there is no such ticket here." },
  },
  {
    method: "get",
    path: "/api/v1/segments",
    name: "listSegments",
    summary:
      "Lists booked segments by production day, each on the day on which it begins. Without `to` up " +
      "to now, without `from` the seven days before `to`; `to` is exclusive.",
    actor: "key",
    may: "segments.read",
    query: segmentsQuery,
    answer: "SegmentPage",
  },
  {
    method: "get",
    path: "/api/v1/analytics/operations",
    name: "readOperations",
    summary:
      "Standard against actual by operation, on finished work (`matched`) or on all time booked. " +
      "Without `to` up to now, without `from` the four weeks before `to`; `to` is exclusive.",
    actor: "key",
    may: "analytics.read",
    query: operationsQuery,
    answer: "OperationsAnswer",
  },
  {
    method: "get",
    path: "/api/v1/analytics/cells",
    name: "readCells",
    summary: "Attendance, standard and actual by cell; the same days and bases.",
    actor: "key",
    may: "analytics.read",
    query: cellsQuery,
    answer: "CellsAnswer",
  },
  {
    method: "get",
    path: "/api/v1/standards",
    name: "listStandards",
    summary:
      "Lists every standard ever entered, in the order of entry: of two for one day the later counts.",
    actor: "key",
    may: "standards.read",
    query: standardsListQuery,
    answer: "StandardPage",
  },
  {
    method: "post",
    path: "/api/v1/standards",
    name: "setStandard",
    summary:
      "Sets a standard from a day on; rows are only added. With an `Idempotency-Key` header the same " +
      "request again is the same row.",
    actor: "key",
    may: "standards.set",
    body: standardEntry,
    answer: "Standard",
    also: { 409: "The `Idempotency-Key` has set another standard already." },
  },
  {
    method: "post",
    path: "/api/v1/calculate/split",
    name: "split",
    summary: "Shares whole seconds by weight, losing none (largest remainder, ties by position).",
    actor: "key",
    may: "calculate",
    body: splitRequest,
    answer: "Split",
  },
  {
    method: "post",
    path: "/api/v1/calculate/check-code",
    name: "checkCode",
    summary: "Reads a scanned or keyed text as a ticket, a badge or a carrier.",
    actor: "key",
    may: "calculate",
    body: checkCodeRequest,
    answer: "CodeReading",
  },
  {
    method: "post",
    path: "/api/v1/calculate/pay",
    name: "pay",
    summary: "What a worker's time comes to under a pay policy, with the reason for every second.",
    actor: "key",
    may: "calculate.pay",
    body: payRequest,
    answer: "PayAnswer",
  },
  {
    method: "get",
    path: "/api/v1/periods",
    name: "listPeriods",
    summary: "Lists pay periods, the latest first, closed ones with what stands beside their file.",
    actor: "key",
    may: "periods.export",
    query: periodsQuery,
    answer: "PeriodPage",
  },
  {
    method: "get",
    path: "/api/v1/periods/{id}/export",
    name: "exportPeriod",
    summary:
      "The file of a closed period as CSV, XLSX or JSON (`format`, JSON unless given): the same bytes " +
      "for ever, their SHA-256 in the `Digest` header. `revision` asks for an earlier closing's.",
    actor: "key",
    may: "periods.export",
    query: exportQuery,
    answer: "PayFile",
    also: {
      404: "No such period or revision here.",
      409: "The period is open.",
      410: "The file was erased.",
    },
  },
  {
    method: "get",
    path: "/api/v1/openapi.json",
    name: "readContract",
    summary: "This document.",
    actor: "nobody",
    answer: "Contract",
  },
  {
    method: "get",
    path: "/api/health",
    name: "readHealth",
    summary: "Says whether the installation can work.",
    actor: "nobody",
    answer: "Health",
    unable: "The database is away or not migrated.",
  },
];

/** Every route of the HTTP contract that stands. A test holds it against the folders under `app`. */
export const apiRoutes: readonly ApiRoute[] = [...kioskRoutes, ...integrationRoutes];
