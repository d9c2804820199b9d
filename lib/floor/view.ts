import type { FloorCell, FloorView, FloorWork } from "@/lib/floor/schema";
import { groupBy } from "@/lib/group";
import { type Activity, activity } from "@/lib/ledger/schema";
import { type StandardRow, standardInForce } from "@/lib/standards/in-force";
import { productionDay, ruleAt } from "@/lib/time/site-day";
import type { SiteRules } from "@/lib/timeline/schema";

/** An interval that runs, one row an item of it, as the database has it. Instants in epoch seconds. */
export interface OpenRow {
  worker: string;
  name: string;
  cell: string | null;
  since: number;
  item: number;
  activity: Activity | "indirect" | "meal" | "rest" | "unassigned";
  code: string | null;
  ticket: string | null;
  operation: string | null;
  weight: number | null;
  operationName: string | null;
  model: string | null;
  options: readonly string[];
  quantity: number | null;
  firstWorkAt: number | null;
  bookedSeconds: number;
  standards: readonly StandardRow[];
}

/** Someone planned to be in now who is not, by home cell; or the next planned start. */
export interface DueRow {
  worker: string;
  name: string;
  cell: string;
  plannedAt: number;
}

export interface FloorFacts {
  cells: readonly string[];
  open: readonly OpenRow[];
  due: readonly DueRow[];
  opensAt: number | null;
  rules: readonly SiteRules[];
}

const UNKNOWN_CELL = "Elsewhere";

/**
 * Gathers who is on what by cell, in the order of the cells; within a cell by operation and ticket.
 * Time belongs to the cell of the act, so borrowed hands show where they work. A cell with nobody in
 * and nobody missing is left out.
 *
 * @param nowMs decides the production day of an operation that has no first work yet
 */
export function floorOf(facts: FloorFacts, nowMs: number): FloorView {
  const names = [...facts.cells, UNKNOWN_CELL];
  const cells = names.map((cell) => cellOf(facts, cell, nowMs));
  return {
    timeZone: ruleAt(facts.rules, nowMs).timeZone,
    cells: cells.filter(({ inCount, missing }) => inCount + missing.length > 0),
    opensAt: facts.opensAt,
  };
}

function cellOf(facts: FloorFacts, cell: string, nowMs: number): FloorCell {
  const rows = facts.open.filter((row) => (row.cell ?? UNKNOWN_CELL) === cell);
  const missing = facts.due.filter((row) => row.cell === cell);
  return {
    cell,
    inCount: new Set(rows.map(({ worker }) => worker)).size,
    work: workOf(facts, rows, nowMs),
    elsewhere: rows.flatMap(({ worker, name, since, activity: doing, code }) =>
      isWork(doing) ? [] : [{ worker, name, since, doing, code }],
    ),
    missing: missing.map(({ worker, name, plannedAt }) => ({ worker, name, plannedAt })),
  };
}

function workOf({ open, rules }: FloorFacts, rows: readonly OpenRow[], nowMs: number): FloorWork[] {
  const byOperation = groupBy(
    rows.filter((row) => isWork(row.activity)),
    ({ ticket, operation }) => `${operation} ${ticket}`,
  );
  return [...byOperation].sort(byKey).map(([, group]) => {
    const [first] = group as [OpenRow, ...OpenRow[]];
    const { ticket, operation, operationName, model, options, quantity, bookedSeconds } = first;
    return {
      ticket: ticket ?? "",
      operation: operation ?? "",
      name: operationName ?? operation ?? "",
      model: model ?? "",
      options: [...options],
      quantity,
      standardSeconds: standardOf(first, rules, nowMs),
      bookedSeconds,
      people: group.flatMap((row) => presentOn(row, open)),
    };
  });
}

/** The row as someone on the work; their other rows of the interval give the weights. */
function presentOn(
  { worker, name, since, item, activity: doing }: OpenRow,
  open: readonly OpenRow[],
) {
  if (!isWork(doing)) return [];
  const interval = open
    .filter((row) => row.worker === worker && row.since === since)
    .sort((a, b) => a.item - b.item);
  const weights = interval.map(({ weight }) => weight ?? 0);
  const share = interval.findIndex((row) => row.item === item);
  return [{ worker, name, since, activity: doing, weights, share }];
}

/** For all its pieces, by the standard of the day of its first work: today, if that is now. */
function standardOf(row: OpenRow, rules: readonly SiteRules[], nowMs: number): number | null {
  const day = productionDay(row.firstWorkAt === null ? nowMs : row.firstWorkAt * 1000, rules);
  const standard = standardInForce(row.standards, day, row.options);
  if (!standard || row.quantity === null) return null;
  return standard.setupSeconds + standard.runSeconds * row.quantity;
}

const isWork = (doing: OpenRow["activity"]): doing is Activity => activity.safeParse(doing).success;

const byKey = ([a]: [string, unknown], [b]: [string, unknown]) => (a < b ? -1 : 1);
