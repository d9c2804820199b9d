import "server-only";
import type { Scope } from "@/db/client";
import {
  asOfOneMoment,
  findSeamBoard,
  listSeamSegments,
  type SummedBy,
  sumWork,
  type WorkWanted,
} from "@/db/seam/queries";
import type { SeamBoard } from "@/lib/analytics/facts";
import type { Opening } from "@/lib/analytics/filter";
import { linesOf, rangeLines } from "@/lib/analytics/lines";
import type { Opened } from "@/lib/analytics/opened";
import { type DaySpan, trendWeeks, weeksOf } from "@/lib/analytics/range";
import type { Basis, WorkRow } from "@/lib/analytics/sums";

/** Sums of the range and of the weeks of its trend, with what stands beside them. */
export interface SeamFigures {
  rows: WorkRow[];
  board: SeamBoard;
  /** How many ranges there are: the whole first, then the weeks. */
  places: number;
}

/** Reads what the pages of standard and actual show, as of one moment; two statements. */
export async function readSeam(
  scope: Scope,
  wanted: WorkWanted,
  { span, by }: { span: DaySpan; by: SummedBy },
): Promise<SeamFigures> {
  const ranges = [span, ...trendWeeks(span)];
  return asOfOneMoment(scope.db, async (db) => {
    const within = { ...scope, db };
    const rows = await sumWork(within, wanted, { ranges, by });
    const board = await findSeamBoard(within, wanted, ranges);
    return { rows, board, places: ranges.length };
  });
}

/** What is read of the operation that is open beside the sums. */
export interface OpenWish {
  operation: string;
  by: Opening;
  /** The ticket whose segments are read; none where it is empty. */
  ticket: string;
}

/** The same with what is behind the operation that is open; at most four statements. */
export async function readOpenSeam(
  scope: Scope,
  wanted: WorkWanted,
  { span, basis, open }: { span: DaySpan; basis: Basis; open: OpenWish | null },
): Promise<SeamFigures & { opened: Opened | null }> {
  const ranges = [span, ...trendWeeks(span)];
  return asOfOneMoment(scope.db, async (db) => {
    const within = { ...scope, db };
    const rows = await sumWork(within, wanted, { ranges, by: "operation" });
    const board = await findSeamBoard(within, wanted, ranges);
    const opened = open && (await readOpened(within, wanted, { span, basis, open }));
    return { rows, board, places: ranges.length, opened };
  });
}

async function readOpened(
  scope: Scope,
  wanted: WorkWanted,
  { span, basis, open }: { span: DaySpan; basis: Basis; open: OpenWish },
): Promise<Opened> {
  const { operation, by, ticket } = open;
  const weeks = by === "week" ? weeksOf(span) : null;
  const rows = await sumWork(
    scope,
    { ...wanted, operation },
    { ranges: weeks ?? [span], by: by === "week" ? "range" : by },
  );
  const lines = weeks
    ? rangeLines(rows, { basis, names: weeks.map(({ first }) => first) })
    : linesOf(rows, { basis, places: 1 });
  const segments =
    by === "ticket" && ticket
      ? await listSeamSegments(scope, { ticket, operation }, wanted.cells)
      : [];
  return { lines, segments };
}
