import { z } from "zod";
import { filterName } from "@/lib/api/page";
import { siteDate } from "@/lib/time/schema";

const basis = z.enum(["matched", "booked"]).default("matched");

/** GET /api/v1/analytics/operations: production days of the site from `from` until before `to`. */
export const operationsQuery = z.strictObject({
  from: siteDate.optional(),
  to: siteDate.optional(),
  cell: filterName.optional(),
  model: filterName.optional(),
  basis,
});

/** GET /api/v1/analytics/cells: the same days. */
export const cellsQuery = z.strictObject({
  from: siteDate.optional(),
  to: siteDate.optional(),
  basis,
});

const seconds = z.number().int();
/** A plain number, 0.95 for 95 %; null where there is nothing to divide by. */
const ratio = z.number().nullable();

/** What was compared; time without a standard is in the actual seconds and left out of efficiency. */
const compared = {
  finished: z.number().int().min(0),
  /** Null: nothing of it has a standard. */
  standardSeconds: seconds.nullable(),
  actualSeconds: seconds,
  noStandardSeconds: seconds,
  reworkSeconds: seconds,
  efficiency: ratio,
};

export const operationsAnswer = z.object({
  items: z.array(
    z.object({
      operation: z.string(),
      stage: z.string().nullable(),
      cell: z.string().nullable(),
      ...compared,
    }),
  ),
  totals: z.object(compared),
});
export type OperationsAnswer = z.infer<typeof operationsAnswer>;

const cellFigures = {
  attendanceSeconds: seconds,
  directSeconds: seconds,
  indirectSeconds: seconds,
  reworkSeconds: seconds,
  restSeconds: seconds,
  mealSeconds: seconds,
  unassignedSeconds: seconds,
  earnedSeconds: seconds,
  matchedEarnedSeconds: seconds,
  matchedActualSeconds: seconds,
  /** Of the chosen basis: left out of its efficiency. */
  noStandardSeconds: seconds,
  efficiency: ratio,
  utilization: ratio,
  productivity: ratio,
};

export const cellsAnswer = z.object({
  items: z.array(z.object({ cell: z.string(), ...cellFigures })),
  totals: z.object(cellFigures),
});
export type CellsAnswer = z.infer<typeof cellsAnswer>;
