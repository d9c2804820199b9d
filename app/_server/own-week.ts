import "server-only";
import { siteOf } from "@/app/_server/site";
import { digestOf, listConfirms, listDayParts } from "@/db/agreement/queries";
import type { Scope } from "@/db/client";
import { listEnds } from "@/db/ends/queries";
import { findMe, listChanges, listOwnPlanned } from "@/db/me/queries";
import { listPeriods, readPolicyBook } from "@/db/pay/queries";
import { cardDays, paySpans, weeksOf, windowOf } from "@/lib/agreement/card";
import { changeLines } from "@/lib/me/changes";
import { type OwnWeek, ownWeek } from "@/lib/me/own-week";
import { addDays, localDate, ruleAt } from "@/lib/time/site-day";
import { zoneClock } from "@/lib/time/zone-clock";

/** How far back periods and questions are looked for, in days. */
const BACK_DAYS = 40;
const AHEAD_DAYS = 14;
const CHANGES_DAYS = 21;
const DAY_MS = 86_400_000;

/** Reads one's own week and period; null where nobody is that worker. */
export async function readOwnWeek(
  scope: Scope,
  { workerId, week, now }: { workerId: string; week: string; now: Date },
): Promise<OwnWeek | null> {
  const { rules } = await siteOf(scope.siteId);
  const nowMs = now.getTime();
  const { timeZone } = ruleAt(rules, nowMs);
  const today = localDate(nowMs, timeZone);
  const asked = week && week < today ? week : today;
  const clock = zoneClock(timeZone);
  const around = { from: addDays(asked, -BACK_DAYS), to: addDays(asked, AHEAD_DAYS) };
  const wanted = { within: null, workerId, ...windowOf(around, clock) };
  const own = { within: null, cell: "", code: "no-shift-end", workerId } as const;
  const since = new Date(nowMs - CHANGES_DAYS * DAY_MS);
  const [me, parts, confirms, planned, ends, changes, book, periods] = await Promise.all([
    findMe(scope, workerId),
    listDayParts(scope, wanted),
    listConfirms(scope, wanted),
    listOwnPlanned(scope, workerId, around),
    listEnds(scope, own, { after: undefined, limit: 10 }),
    listChanges(scope, workerId, since),
    readPolicyBook(scope),
    listPeriods(scope, { limit: 6 }),
  ]);
  if (!me) return null;
  const weeks = weeksOf(book, workerId, around, clock);
  return ownWeek({
    me,
    asked,
    today,
    parts,
    planned,
    weeks,
    card: cardDays({ parts, confirms }, { weeks, range: around, digestOf, nowMs }),
    spans: paySpans(parts, nowMs),
    period: periods.find(({ from, to }) => from <= asked && asked < to) ?? null,
    ends,
    changes: changeLines(changes, timeZone),
    clock,
    nowMs,
  });
}
