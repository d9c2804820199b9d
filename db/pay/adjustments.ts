import type { Scope } from "@/db/client";
import { readCards } from "@/db/pay/cards";
import { type LatePeriod, listLatePeriods, listPaidAbout } from "@/db/pay/frozen";
import { groupBy } from "@/lib/group-by";
import { adjustmentsOf, type PaidWorkday } from "@/lib/periods/adjust";
import type { Card, CardWorker } from "@/lib/periods/card";

/** What an earlier period paid otherwise than its records say now, of one worker. */
export interface Adjustment extends PaidWorkday {
  worker: CardWorker;
  /** The closed period that the workday belongs to. */
  aboutId: string;
  aboutFrom: string;
}

/**
 * Works out what closed periods still owe, or paid too much, by worker, workweek and workday
 * (LEDGER.md 10). Policies cannot be set for closed days, so the statement of now goes by the
 * versions that were frozen.
 */
export async function readAdjustments(
  scope: Scope,
  now: { timeZone: string; nowMs: number },
): Promise<Adjustment[]> {
  const adjustments: Adjustment[] = [];
  for (const period of await listLatePeriods(scope)) {
    adjustments.push(...(await readOf(scope, period, now)));
  }
  return adjustments;
}

async function readOf(
  scope: Scope,
  { id, from, to, workers }: LatePeriod,
  { timeZone, nowMs }: { timeZone: string; nowMs: number },
): Promise<Adjustment[]> {
  const wanted = { from, to, isClosed: true, workers, timeZone, nowMs };
  const { cards } = await readCards(scope, wanted);
  const paid = groupBy(
    await listPaidAbout(scope, { aboutId: id, workers }),
    ({ workerId }) => workerId,
  );
  return cards.flatMap((card) =>
    adjustmentsOf(statedDays(card), paid.get(card.worker.id) ?? []).map((day) => ({
      ...day,
      worker: card.worker,
      aboutId: id,
      aboutFrom: from,
    })),
  );
}

/** The days of a card as they are paid. */
function statedDays({ days }: Card): PaidWorkday[] {
  return days.flatMap(({ stated }) => stated);
}
