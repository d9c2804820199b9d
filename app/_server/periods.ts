import "server-only";
import { siteOf } from "@/app/_server/site";
import type { Scope } from "@/db/client";
import { type Adjustment, readAdjustments } from "@/db/pay/adjustments";
import { readCards, windowsOf } from "@/db/pay/cards";
import { type FrozenRow, listFrozenCards, listFrozenRows } from "@/db/pay/frozen";
import { type PeriodRow, sumPlanned } from "@/db/pay/queries";
import { readTime } from "@/db/pay/time";
import { groupBy } from "@/lib/group-by";
import type { Card } from "@/lib/periods/card";
import { type CardLine, lineOfCard, lineOfFrozen, statedOf } from "@/lib/periods/cards-view";
import { sharedHours, summedHours } from "@/lib/periods/file-hours";
import { type ShownDay, shownDays } from "@/lib/periods/shown-days";
import { ruleAt } from "@/lib/time/site-day";
import { zoneClock } from "@/lib/time/zone-clock";

/** What the page of cards shows of a period. */
export interface PeriodPage {
  lines: CardLine[];
  /** Of a closed period, without adjustments of others: what records come to now, and what was paid. */
  recorded: CardLine[];
  paid: CardLine[];
  /** What the records come to now, by worker's id. */
  cards: ReadonlyMap<string, Card>;
  frozen: readonly FrozenRow[];
  /** What closed periods still owe, to be paid with the first open one. */
  adjustments: readonly Adjustment[];
  timeZone: string;
  hasPolicy: boolean;
  isOver: boolean;
}

/** Reads the cards of a period: as they are while it is open, as they were frozen once it is closed. */
export async function readPeriodPage(
  scope: Scope,
  period: PeriodRow,
  { homeCells, now }: { homeCells: readonly string[] | null; now: Date },
): Promise<PeriodPage> {
  const { from, to, isClosed, revision, id: periodId } = period;
  const nowMs = now.getTime();
  const { rules } = await siteOf(scope.siteId);
  const { timeZone } = ruleAt(rules, nowMs);
  const closing = { periodId, revision };
  const [{ cards, overMs }, planned, frozenCards, frozen, adjustments] = await Promise.all([
    readCards(scope, { from, to, isClosed, homeCells, timeZone, nowMs }),
    sumPlanned(scope, { from, to }),
    isClosed ? listFrozenCards(scope, closing) : [],
    isClosed ? listFrozenRows(scope, closing) : [],
    readAdjustments(scope, { timeZone, nowMs }),
  ]);
  const byId = new Map(cards.map((card) => [card.worker.id, card]));
  const rowsOf = groupBy(frozen, ({ workerId }) => workerId);
  const closed = frozenCards
    .filter(({ id }) => homeCells === null || byId.has(id))
    .map(({ id, ...card }) => {
      const rows = rowsOf.get(id) ?? [];
      const plannedSeconds = planned.get(id) ?? null;
      const changes = rows.filter(({ aboutId }) => aboutId !== periodId);
      const days = rows.filter(({ aboutId }) => aboutId === periodId);
      return lineOfFrozen({ ...card, workerId: id }, days, { plannedSeconds, changes });
    });
  const open = cards.map((card) => lineOfCard(card, planned.get(card.worker.id) ?? null));
  const paid = closed.map((line) => {
    const own = (rowsOf.get(line.worker.id) ?? []).filter(({ aboutId }) => aboutId === periodId);
    return { ...line, hours: summedHours(sharedHours(own)) };
  });
  return {
    lines: isClosed ? closed : open,
    recorded: open,
    paid,
    cards: byId,
    frozen,
    adjustments: adjustments.filter(({ worker }) => homeCells === null || byId.has(worker.id)),
    timeZone,
    hasPolicy: overMs !== null,
    isOver: overMs !== null && nowMs >= overMs,
  };
}

/**
 * The days of one card with the reasons for every second: as they are while the period is open, as
 * they were frozen once it is closed. Null for someone who has no card on the page.
 */
export async function readOpenCard(
  scope: Scope,
  asked: { period: PeriodRow; seen: PeriodPage; number: string; now: Date },
): Promise<ShownDay[] | null> {
  const { period, seen, number, now } = asked;
  const line = seen.lines.find(({ worker }) => worker.number === number);
  if (!line) return null;
  const clock = zoneClock(seen.timeZone);
  const [time] = await readTime(scope, [line.worker], windowsOf(period, [], clock));
  const card = seen.cards.get(line.worker.id);
  const rows = seen.frozen.filter(({ workerId }) => workerId === line.worker.id);
  return shownDays({
    periodId: period.id,
    stated: period.isClosed ? null : card ? statedOf(card) : [],
    rows,
    workdays: card?.days ?? [],
    warnings: card?.warnings ?? [],
    parts: time?.parts ?? [],
    nowMs: now.getTime(),
  });
}
