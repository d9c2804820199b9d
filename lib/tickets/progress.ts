import type { SeamPair } from "@/lib/seam/verdict";
import { decidingDay } from "@/lib/standards/deciding-day";
import { type StandardRow, standardInForce } from "@/lib/standards/in-force";
import { sum } from "@/lib/sum";
import type { DayRule } from "@/lib/time/site-day";

/** An operation of a ticket as the judge left it. */
export interface ProgressRow {
  operation: string;
  state: "waiting" | "ready" | "working" | "finished" | "closed";
  good: number;
  actualSeconds: number;
  firstWorkAt: Date | null;
  finishedAt: Date | null;
}

/** How far a ticket is, and what its finished work took against its standard. */
export interface Progress {
  done: number;
  of: number;
  isWorkedOn: boolean;
  /** Finished operations that have a standard; standard for the good pieces. */
  finished: SeamPair;
  /** Time of finished operations without a standard: left out of the pair, and said. */
  noStandardSeconds: number;
}

/**
 * Sums what a ticket's finished operations took and earned, like for like: only operations that are
 * finished and have a standard, setup once and run for each good piece.
 *
 * @param standards of the ticket's model
 */
export function progressOf(
  rows: readonly ProgressRow[],
  {
    standards,
    options,
    rules,
  }: {
    standards: readonly (StandardRow & { operation: string })[];
    options: readonly string[];
    rules: readonly DayRule[];
  },
): Progress {
  const finished = rows
    .filter(({ state }) => state === "finished")
    .map((row) => {
      const first = { workMs: instantOf(row.firstWorkAt), countMs: instantOf(row.finishedAt) };
      const day = decidingDay(first, rules);
      const own = standards.filter(({ operation }) => operation === row.operation);
      const standard = day === null ? null : standardInForce(own, day, options);
      const standardSeconds = standard && standard.setupSeconds + standard.runSeconds * row.good;
      return { actualSeconds: row.actualSeconds, standardSeconds };
    });
  const timed = finished.filter(({ standardSeconds }) => standardSeconds !== null);
  const untimed = finished.filter(({ standardSeconds }) => standardSeconds === null);
  return {
    done: rows.filter(({ state }) => state === "finished" || state === "closed").length,
    of: rows.length,
    isWorkedOn: rows.some(({ state }) => state === "working"),
    finished: {
      standardSeconds:
        timed.length > 0 ? sum(timed.map(({ standardSeconds }) => standardSeconds ?? 0)) : null,
      actualSeconds: sum(timed.map(({ actualSeconds }) => actualSeconds)),
    },
    noStandardSeconds: sum(untimed.map(({ actualSeconds }) => actualSeconds)),
  };
}

function instantOf(at: Date | null): number | null {
  return at?.getTime() ?? null;
}
