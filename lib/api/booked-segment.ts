import type { BookedSegment } from "@/lib/api/segments";

/** A segment as the database lists it. */
export interface SegmentRow extends Omit<BookedSegment, "start" | "end" | "worker">, NamedWorker {
  startAt: Date;
  endAt: Date | null;
}

interface NamedWorker {
  workerNumber: string;
  workerName: string;
}

/** A segment as the integration sees it; its worker only where the caller may know people. */
export function bookedSegmentOf(row: SegmentRow, mayName: boolean): BookedSegment {
  return {
    start: row.startAt.toISOString(),
    end: row.endAt?.toISOString() ?? null,
    seconds: row.seconds,
    activity: row.activity,
    ticket: row.ticket,
    operation: row.operation,
    code: row.code,
    cell: row.cell,
    said: row.said,
    ...workerOf(row, mayName),
  };
}

/** The `worker` field, or none at all. */
export function workerOf(
  { workerNumber, workerName }: NamedWorker,
  mayName: boolean,
): Pick<BookedSegment, "worker"> {
  return mayName ? { worker: { worker: workerNumber, name: workerName } } : {};
}
