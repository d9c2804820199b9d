import type { z } from "zod";
import { bookedSegmentOf, type SegmentRow, workerOf } from "@/lib/api/booked-segment";
import { type ListedTicket, ticketSummaryOf } from "@/lib/api/ticket-summary";
import type { BirthRecord, recordedOperation, recordedReport } from "@/lib/api/tickets";
import { decidingDay } from "@/lib/standards/deciding-day";
import { type StandardRow, standardInForce } from "@/lib/standards/in-force";
import { sum } from "@/lib/sum";
import { type DayRule, productionDay } from "@/lib/time/site-day";

type Operation = z.infer<typeof recordedOperation>;
type Report = z.infer<typeof recordedReport>;

/** All that the database knows of a ticket; lists in the order of routing or time. */
export interface TicketLife {
  ticket: ListedTicket;
  operations: readonly OperationRow[];
  standards: readonly (StandardRow & { operation: string })[];
  segments: readonly SegmentRow[];
  reports: readonly ReportRow[];
}

type OperationRow = Pick<
  Operation,
  "operation" | "name" | "stage" | "cell" | "state" | "openQuantity" | "good" | "rework" | "scrap"
> & { finishedAt: Date | null };

type ReportRow = Omit<Report, "at" | "worker"> & Parameters<typeof workerOf>[0] & { at: Date };

/** What the record needs besides the ticket: the site's days, the moment, and who asks. */
export interface RecordFacts {
  rules: readonly DayRule[];
  nowMs: number;
  mayName: boolean;
}

/**
 * Writes the birth record of a ticket: standard beside actual for each operation, then everything
 * that was booked and counted. Actual is the sum of the segments shown, so that anyone can add up.
 */
export function birthRecordOf(life: TicketLife, facts: RecordFacts): BirthRecord {
  return {
    ...ticketSummaryOf(life.ticket),
    operations: life.operations.map((row) => operationOf(row, life, facts)),
    segments: life.segments.map((row) => bookedSegmentOf(row, facts.mayName)),
    reports: life.reports.map((row) => reportOf(row, facts.mayName)),
  };
}

function operationOf(row: OperationRow, life: TicketLife, facts: RecordFacts): Operation {
  const booked = life.segments.filter(({ operation }) => operation === row.operation);
  const first = booked.find(({ activity }) => activity !== "rework")?.startAt ?? null;
  const counted = life.reports.find(({ operation }) => operation === row.operation)?.at ?? null;
  const begun = { workMs: first?.getTime() ?? null, countMs: counted?.getTime() ?? null };
  // before any work the one that would hold today
  const day = decidingDay(begun, facts.rules) ?? productionDay(facts.nowMs, facts.rules);
  const standards = life.standards.filter(({ operation }) => operation === row.operation);
  const standard = standardInForce(standards, day, life.ticket.options);
  const quantity = row.good + row.scrap + row.openQuantity;
  return {
    operation: row.operation,
    name: row.name,
    stage: row.stage,
    cell: row.cell,
    state: row.state,
    quantity,
    openQuantity: row.openQuantity,
    good: row.good,
    rework: row.rework,
    scrap: row.scrap,
    setupSeconds: standard?.setupSeconds ?? null,
    runSeconds: standard?.runSeconds ?? null,
    standardSeconds: standard && standard.setupSeconds + standard.runSeconds * quantity,
    actualSeconds: sum(booked.map(({ seconds }) => seconds ?? 0)),
    firstWorkAt: first?.toISOString() ?? null,
    finishedAt: row.finishedAt?.toISOString() ?? null,
  };
}

function reportOf(row: ReportRow, mayName: boolean): Report {
  const { kind, operation, good, rework, scrap, stop, causedBy, cell } = row;
  return {
    kind,
    at: row.at.toISOString(),
    operation,
    good,
    rework,
    scrap,
    stop,
    causedBy,
    defects: [...row.defects],
    cell,
    ...workerOf(row, mayName),
  };
}
