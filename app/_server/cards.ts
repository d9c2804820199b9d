import "server-only";
import { siteOf } from "@/app/_server/site";
import { digestOf, listConfirms, listDayParts } from "@/db/agreement/queries";
import type { Scope } from "@/db/client";
import { listOpenByWorker } from "@/db/ends/queries";
import { listPlannedSums } from "@/db/me/queries";
import { listPeriods, readPolicyBook } from "@/db/pay/queries";
import { cardDays, weeksOf, windowOf } from "@/lib/agreement/card";
import type { CardRead } from "@/lib/agreement/page";
import { groupBy } from "@/lib/group";
import { addDays, localDate, ruleAt } from "@/lib/time/site-day";
import { zoneClock } from "@/lib/time/zone-clock";

/** Without pay periods cards are of the last fortnight. */
const FORTNIGHT_DAYS = 14;

/** Reads the cards of the people of some cells for the pay period of a date. */
export async function readCards(
  scope: Scope,
  { within, asked, now }: { within: readonly string[] | null; asked: string; now: Date },
) {
  const { rules } = await siteOf(scope.siteId);
  const nowMs = now.getTime();
  const { timeZone } = ruleAt(rules, nowMs);
  const today = localDate(nowMs, timeZone);
  const periods = await listPeriods(scope, { limit: 12 });
  const period = periods.find(({ from }) => from === asked) ?? firstOpen(periods, today);
  const range = period ?? { from: addDays(today, 1 - FORTNIGHT_DAYS), to: addDays(today, 1) };
  const clock = zoneClock(timeZone);
  const wanted = { within, ...windowOf(range, clock) };
  const bounds = {
    from: new Date(clock.secondOf(range.from, "00:00") * 1000),
    to: new Date(clock.secondOf(range.to, "00:00") * 1000),
  };
  const [parts, confirms, planned, ends, book] = await Promise.all([
    listDayParts(scope, wanted),
    listConfirms(scope, wanted),
    listPlannedSums(scope, within, range),
    listOpenByWorker(scope, within, bounds),
    readPolicyBook(scope),
  ]);
  const confirmsOf = groupBy(confirms, ({ workerId }) => workerId);
  const cards = [...groupBy(parts, ({ workerId }) => workerId)].flatMap(
    ([workerId, own]): CardRead[] => {
      const [{ number, name, cell }] = own as [(typeof own)[number]];
      const source = { parts: own, confirms: confirmsOf.get(workerId) ?? [] };
      const weeks = weeksOf(book, workerId, range, clock);
      const days = cardDays(source, { weeks, range, digestOf, nowMs });
      if (days.length === 0) return [];
      return [
        {
          number,
          name,
          cell,
          days,
          plannedSeconds: planned.get(workerId) ?? null,
          openEnds: ends.get(workerId) ?? 0,
          isClosed: period?.isClosed ?? false,
        },
      ];
    },
  );
  return { cards, range: { from: range.from, to: range.to }, periods, timeZone };
}

/** The oldest period that waits to be closed, else the one that runs. */
function firstOpen<P extends { from: string; to: string; isClosed: boolean }>(
  periods: readonly P[],
  today: string,
): P | undefined {
  const open = periods.filter(({ isClosed, from }) => !isClosed && from <= today);
  return open.at(-1) ?? periods[0];
}
