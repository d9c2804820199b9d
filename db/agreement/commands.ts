import { digestOf, listDayParts } from "@/db/agreement/queries";
import type { Scope } from "@/db/client";
import type { Settling } from "@/db/ends/commands";
import { bookDeed } from "@/db/ledger/office";
import { idFrom } from "@/db/ledger/receive";
import { readPolicyBook } from "@/db/pay/queries";
import { cardDays, weeksOf, windowOf } from "@/lib/agreement/card";
import type { AgreeForm, NamedDay } from "@/lib/agreement/schema";
import { agreementSubject } from "@/lib/agreement/signatures";
import { groupBy } from "@/lib/group";
import { no, type Result } from "@/lib/result";
import { addDays, ruleAt } from "@/lib/time/site-day";
import { zoneClock } from "@/lib/time/zone-clock";

/**
 * Agrees to workdays as they were shown (LEDGER.md 4). A day that changed meanwhile is refused, so
 * that nobody agrees to what they have not seen; sent twice it is agreed to once.
 */
export async function agreeDays(
  scope: Scope,
  form: AgreeForm,
  agreeing: Settling,
): Promise<Result<void>> {
  const changed = await findChanged(scope, form.days, agreeing);
  if (changed) {
    const { worker, date } = changed;
    return no("conflict", `${date} of ${worker} has changed or still runs. Look at it again.`);
  }
  const { by, actor, now, within } = agreeing;
  return bookDeed(scope, {
    acts: form.days.map(({ worker, date, digest }) => ({
      id: idFrom(`${form.id} ${worker} ${date}`),
      worker,
      body: { kind: "confirm", subject: agreementSubject(date, digest) },
      note: null,
    })),
    by,
    actor,
    now,
    within,
  });
}

/** The first of the days that is not as it was shown; null where all are. */
async function findChanged(
  scope: Scope,
  days: readonly NamedDay[],
  { within, now, rules }: Settling,
): Promise<NamedDay | null> {
  const dates = days.map(({ date }) => date).toSorted();
  const range = { from: dates[0]!, to: addDays(dates.at(-1)!, 1) };
  const { timeZone } = ruleAt(rules, now.getTime());
  const clock = zoneClock(timeZone);
  const [book, parts] = await Promise.all([
    readPolicyBook(scope),
    listDayParts(scope, { within, ...windowOf(range, clock) }),
  ]);
  const byNumber = groupBy(parts, ({ number }) => number);
  const wanted = groupBy(days, ({ worker }) => worker);
  for (const [worker, named] of wanted) {
    const own = byNumber.get(worker) ?? [];
    const weeks = weeksOf(book, own[0]?.workerId ?? "", range, clock);
    const nowMs = now.getTime();
    const card = cardDays({ parts: own, confirms: [] }, { weeks, range, digestOf, nowMs });
    const isNow = new Map(card.map(({ date, digest }) => [date, digest]));
    const changed = named.find(({ date, digest }) => isNow.get(date) !== digest);
    if (changed) return changed;
  }
  return null;
}
