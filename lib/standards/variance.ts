import { assert } from "@/lib/assert";

/** Labour that was worked and what it should have taken; a cost is in one unit of money throughout. */
export interface Labour {
  actualSeconds: number;
  standardSeconds: number;
  /** What the actual hours cost, and what an hour costs by standard. */
  actualCost: number;
  standardRate: number;
}

/** Money; above 0 is unfavourable: more was spent than the standard allows. */
export interface LabourVariance {
  efficiency: number;
  rate: number;
  /** Always the sum of the two. */
  total: number;
}

/** How many hours more than the standard were worked; below 0 fewer. */
export function varianceHours(labour: Pick<Labour, "actualSeconds" | "standardSeconds">): number {
  return (labour.actualSeconds - labour.standardSeconds) / 3600;
}

/**
 * Splits what labour cost more than its standard (CALCULATIONS.md 3): the hours too many at the
 * standard rate, and what the actual hours cost beyond that rate. It is worked out from the amount,
 * not from a rounded actual rate; no hours at all have no variance but their cost.
 *
 * Source: Horngren/Datar/Rajan, Cost Accounting, chapter 7.
 */
export function labourVariance(labour: Labour): LabourVariance {
  const { actualSeconds, actualCost, standardRate } = labour;
  assert(
    Object.values(labour).every((figure) => Number.isFinite(figure) && figure >= 0),
    "labourVariance: figures are 0 or more",
  );
  const efficiency = varianceHours(labour) * standardRate;
  const rate = actualCost - (actualSeconds / 3600) * standardRate;
  return { efficiency, rate, total: efficiency + rate };
}
