import type { BirthRecord } from "@/lib/api/tickets";
import { groupBy } from "@/lib/group";
import type { SeamPair } from "@/lib/seam/verdict";
import { sum } from "@/lib/sum";
import { instantMs } from "@/lib/time/instant";

type Operation = BirthRecord["operations"][number];

/** One line of what was booked or counted on an operation, in the order of time. */
export type SheetLine =
  | ({ line: "segment" } & BirthRecord["segments"][number])
  | ({ line: "report" } & BirthRecord["reports"][number]);

/** An operation of a ticket with its seam and everything behind it. */
export interface SheetOperation extends Operation {
  /** Standard for the good pieces once it is finished, for all its pieces before. */
  pair: SeamPair;
  /** Names of who is on it now. */
  onIt: string[];
  lines: SheetLine[];
}

/** A ticket as its page shows it. */
export interface Sheet {
  operations: SheetOperation[];
  /** Finished operations that have a standard: like for like. */
  finished: SeamPair;
  done: number;
  /** What was booked on operations that the ticket does not have. */
  strays: SheetLine[];
}

/**
 * Puts standard and actual of each operation on one seam, with every segment and count behind it.
 * Actual is what has ended; who is on it now is named apart.
 */
export function sheetOf(record: BirthRecord): Sheet {
  const lines: SheetLine[] = [
    ...record.segments.map((segment) => ({ line: "segment" as const, ...segment })),
    ...record.reports.map((report) => ({ line: "report" as const, ...report })),
  ].sort((a, b) => startOf(a) - startOf(b));
  const byOperation = groupBy(lines, ({ operation }) => operation);
  const operations = record.operations.map((operation) => {
    const own = byOperation.get(operation.operation) ?? [];
    return { ...operation, pair: pairOf(operation), onIt: onItNow(own), lines: own };
  });
  const timed = operations.filter(
    ({ state, pair }) => state === "finished" && pair.standardSeconds !== null,
  );
  const known = new Set(record.operations.map(({ operation }) => operation));
  return {
    operations,
    finished: {
      standardSeconds: timed.length > 0 ? sum(timed.map(standardOf)) : null,
      actualSeconds: sum(timed.map(({ pair }) => pair.actualSeconds)),
    },
    done: operations.filter(({ state }) => state === "finished" || state === "closed").length,
    strays: lines.filter(({ operation }) => operation === null || !known.has(operation)),
  };
}

function pairOf({ state, standardSeconds, ...operation }: Operation): SeamPair {
  const { setupSeconds, runSeconds, good, actualSeconds } = operation;
  const earned = state === "finished" && setupSeconds !== null && runSeconds !== null;
  return {
    standardSeconds: earned ? setupSeconds + runSeconds * good : standardSeconds,
    actualSeconds,
  };
}

const standardOf = ({ pair }: SheetOperation) => pair.standardSeconds ?? 0;

const startOf = (line: SheetLine) => instantMs(line.line === "segment" ? line.start : line.at) ?? 0;

function onItNow(lines: readonly SheetLine[]): string[] {
  return lines.flatMap((line) =>
    line.line === "segment" && line.end === null ? [line.worker?.name ?? "someone"] : [],
  );
}
