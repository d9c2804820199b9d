import { type Act, isSameItem } from "@/lib/acts/act";
import type { Item, LooseEndCode } from "@/lib/ledger/schema";
import { instantMs } from "@/lib/time/instant";
import { ruleAt } from "@/lib/time/site-day";
import {
  type Activity,
  beginActivity,
  beginBreak,
  type OpenShift,
} from "@/lib/timeline/open-shift";
import type { SiteRules, WorkItem } from "@/lib/timeline/schema";

/** Nobody opens two tablets with one badge in less time. */
const TWO_PLACES_SECONDS = 5;

/** Raises a loose end: its code, the event it hangs on, where it lies in epoch seconds. */
export type Ask = (code: LooseEndCode, subject: string, at: number) => void;

/** An act at its second, with the site's rules and a way to ask. */
interface Moment {
  act: Act;
  /** Epoch seconds. */
  at: number;
  rules: readonly SiteRules[];
  ask: Ask;
}

/**
 * Lets an act within a shift take effect on what its worker does from then on (LEDGER.md 3). Changes
 * `shift`; an act that says nothing of what is being done changes nothing.
 */
export function takeEffect(shift: OpenShift, moment: Moment): void {
  const { act, at, ask } = moment;
  const { body } = act;
  if (isElsewhere(shift, act, at)) ask("two-kiosks", act.id, at);
  if (body.kind === "work") {
    const items = workItems(body.items, act.weights);
    doNext(shift, moment, { kind: "work", activity: body.activity, items });
  } else if (body.kind === "indirect") {
    doNext(shift, moment, { kind: "indirect", code: body.code });
  } else if (body.kind === "break-start") interrupt(shift, moment, body.break);
  else if (body.kind === "break-end") resume(shift, moment);
  else takeOut(shift, moment);
}

/** Asks about the break that runs, if it is longer than the site allows at `end` (epoch seconds). */
export function askLongBreak(
  shift: OpenShift,
  end: number,
  { rules, ask }: Pick<Moment, "rules" | "ask">,
): void {
  if (!shift.break) return;
  const { kind, since, event } = shift.break;
  const { mealMaxSeconds, restMaxSeconds } = ruleAt(rules, since * 1000);
  const maxSeconds = kind === "meal" ? mealMaxSeconds : restMaxSeconds;
  if (end - since > maxSeconds) ask("break-long", event, since);
}

/** Work or other work replaces what the worker was on, and ends a break. */
function doNext(shift: OpenShift, moment: Moment, doing: Activity): void {
  const { act, at } = moment;
  const { from, said } = beginningOf(shift, moment);
  const dropped = shift.activity.doing.kind === "work" ? shift.activity.doing.items : [];
  const endedBreak = shift.break !== null;
  askLongBreak(shift, from, moment);
  shift.lastCell = act.cell ?? shift.lastCell;
  const activity = { doing, cell: shift.lastCell, event: act.id };
  beginActivity(shift, activity, { at: from, said, event: act.id });
  shift.changed = { at, kiosk: act.kiosk, dropped, endedBreak };
}

/** Where an activity begins: at the tap, or where the person says it began (LEDGER.md 3, `since`). */
function beginningOf(shift: OpenShift, { act, at, rules, ask }: Moment) {
  const text = "since" in act.body ? act.body.since : undefined;
  if (text === undefined) return { from: at, said: false };
  const since = Math.floor((instantMs(text) ?? Number.NaN) / 1000);
  const isWithinShift = since >= shift.start && since <= at;
  const isAfterChange = shift.changed === null || since > shift.changed.at;
  const isRecent = at - since <= ruleAt(rules, at * 1000).sinceLimitSeconds;
  if (isWithinShift && isAfterChange && isRecent) return { from: since, said: since < at };
  ask("since-outside", act.id, at);
  return { from: at, said: false };
}

/** A break interrupts the activity; one of the other kind takes its place, the same changes nothing. */
function interrupt(shift: OpenShift, moment: Moment, kind: "meal" | "rest"): void {
  const { act, at } = moment;
  if (shift.break?.kind === kind) return;
  askLongBreak(shift, at, moment);
  beginBreak(shift, { kind, at, event: act.id });
  shift.changed = { at, kiosk: act.kiosk, dropped: [], endedBreak: false };
}

/** A break's end resumes what it interrupted. */
function resume(shift: OpenShift, moment: Moment): void {
  const { act, at } = moment;
  if (!shift.break) return;
  askLongBreak(shift, at, moment);
  beginActivity(shift, shift.activity, { at, said: false, event: act.id });
  shift.changed = { at, kiosk: act.kiosk, dropped: [], endedBreak: true };
}

/** Items leave the work, also the work that a break interrupts; with none left it is unassigned. */
function takeOut(shift: OpenShift, { act, at }: Moment): void {
  const { doing, cell, event } = shift.activity;
  const items = doing.kind === "work" ? doing.items : [];
  const { out } = act;
  const dropped = items.filter((item) => out === "all" || out.some((one) => isSameItem(one, item)));
  const isOther = out === "all" && doing.kind === "indirect";
  if (dropped.length === 0 && !isOther) return;
  const left = items.filter((item) => !dropped.includes(item));
  const next =
    doing.kind === "work" && left.length > 0
      ? { doing: { ...doing, items: left }, cell, event }
      : { doing: { kind: "unassigned" as const }, cell: shift.lastCell, event: act.id };
  if (shift.break) shift.activity = { ...shift.activity, ...next };
  else beginActivity(shift, next, { at, said: false, event: act.id });
  shift.changed = { at, kiosk: act.kiosk, dropped, endedBreak: false };
}

/**
 * Says whether an act goes against what the worker did at another kiosk: sooner than a person can
 * walk, or ending what the other one ended already. Acts that a lead entered do not count.
 */
function isElsewhere(shift: OpenShift, act: Act, at: number): boolean {
  if (act.kiosk === null || act.by !== null) return false;
  const { lastTap, changed } = shift;
  const isFar = (kiosk: string | null) => kiosk !== null && kiosk !== act.kiosk;
  if (isFar(lastTap.kiosk) && at - lastTap.at < TWO_PLACES_SECONDS) return true;
  if (!changed || !isFar(changed.kiosk)) return false;
  if (act.body.kind === "break-end") return shift.break === null && changed.endedBreak;
  const { doing } = shift.activity;
  const items = doing.kind === "work" ? doing.items : [];
  const out = act.out === "all" ? [] : act.out;
  return out.some(
    (item) =>
      changed.dropped.some((one) => isSameItem(one, item)) &&
      !items.some((one) => isSameItem(one, item)),
  );
}

/** The items of an act, each once, with the weights booked with it; equal where none were. */
function workItems(items: readonly Item[], weights: readonly number[]): WorkItem[] {
  return items
    .map(({ ticket, operation, weight }, index) => ({
      ticket,
      operation,
      weight: weights[index] ?? weight ?? 1,
    }))
    .filter((item, index, all) => all.findIndex((one) => isSameItem(one, item)) === index);
}
