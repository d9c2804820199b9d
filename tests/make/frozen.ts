import type { PaidWorkday } from "@/lib/periods/adjust";
import type { Frozen, FrozenCard } from "@/lib/periods/frozen";

export const PERIOD = {
  id: "01890a5d-ac96-774b-bcce-b302099a8057",
  from: "2026-05-31",
  to: "2026-06-14",
};
export const EARLIER = "01890a5d-ac96-774b-bcce-b302099a8001";

/** A paid workday of so many seconds of regular time and overtime. */
export function makeDay(
  date: string,
  regular: number,
  other: Partial<Omit<PaidWorkday, "buckets">> & { overtime?: number; double?: number } = {},
): PaidWorkday {
  const { overtime = 0, double = 0, ...rest } = other;
  const paidSeconds = regular + overtime + double;
  return {
    workweek: "2026-05-31",
    date,
    policy: "us-federal 1",
    workedSeconds: paidSeconds,
    paidSeconds,
    buckets: { regular, overtime, double },
    premiums: {},
    ...rest,
  };
}

/** A frozen card of worker 1042. */
export function makeFrozenCard(other: Partial<FrozenCard> = {}): FrozenCard {
  return {
    workerId: "w1",
    number: "1042",
    name: "Ilo Varn",
    cell: "Mill",
    payrollNumber: "71042",
    reason: null,
    openEnds: 0,
    signedByWorker: true,
    signedByLead: true,
    ...other,
  };
}

/** A closing of some cards, with the days of worker w1 in the period itself. */
export function makeFrozen(days: readonly PaidWorkday[], other: Partial<Frozen> = {}): Frozen {
  return {
    site: "Testing",
    period: PERIOD,
    revision: 1,
    closedAt: "2026-06-15T15:00:00.000Z",
    closedBy: "Winifred Ashgrove",
    digest: "a".repeat(64),
    cards: [makeFrozenCard()],
    days: days.map((day) => ({
      ...day,
      workerId: "w1",
      aboutId: PERIOD.id,
      aboutFrom: PERIOD.from,
    })),
    ...other,
  };
}
