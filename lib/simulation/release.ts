import { ticketNumberOf } from "@/lib/codes/ticket-code";
import type { DemoCalendar } from "@/lib/demo/calendar";
import { type DemoModel, models, NEW_MODEL } from "@/lib/demo/models";
import { routingOf } from "@/lib/demo/operations";
import type { Random } from "@/lib/demo/random";
import { NEW_MODEL_DAY } from "@/lib/demo/standards";
import { freshStep, type Traveller } from "@/lib/simulation/traveller";

/** Tickets are promised so many days after their release. */
const PROMISE_DAYS = [36, 56] as const;
const ORDER_FIRST = 24_110;
const RUNNING_FIRST = 3_870;
const DAY_SECONDS = 86_400;

/** Lets tickets go to the floor, one after the other, in the order of their numbers. */
export interface Releaser {
  /** Makes a ticket, released at an epoch second, whose first `done` share of the work is over. */
  release(at: number, done?: number): Traveller;
}

/** Opens the releasing of a run; orders, models, lots and numbers follow from `random` alone. */
export function releaserOf(calendar: DemoCalendar, random: Random): Releaser {
  let running = RUNNING_FIRST;
  let order = { number: ORDER_FIRST, dueOn: "" };
  return {
    release(at, done = 0) {
      const model = pickModel(dayOf(calendar, at), random);
      const lot = random.pick(model.lots);
      if (order.dueOn === "" || random.chance(0.5)) {
        order = { number: order.number + random.whole(1, 4), dueOn: dueOn(at, random) };
      }
      running += 1;
      const steps = routingOf(model).map((operation) => freshStep(operation, lot));
      return {
        number: ticketNumberOf(yearOf(at), running),
        model,
        option: model.options[random.chance(0.4) ? 1 : 0]!,
        order: String(order.number),
        dueOn: order.dueOn,
        releasedAt: at,
        lot,
        quantity: lot,
        steps,
        current: Math.floor(done * steps.length),
        readyAt: at,
        endedAt: null,
      };
    },
  };
}

/** Index of the day of the history in which an instant lies; negative before it. */
export function dayOf(calendar: DemoCalendar, at: number): number {
  return Math.floor((at - calendar.startsAt) / DAY_SECONDS);
}

/** By share, among the models that are on the floor on that day. */
function pickModel(day: number, random: Random): DemoModel {
  const known = models.filter(({ name }) => name !== NEW_MODEL || day >= NEW_MODEL_DAY);
  return random.pickBy(known, ({ share }) => share);
}

/** A date for a customer: no time zone can move a promise by more than the day it is good for. */
function dueOn(at: number, random: Random): string {
  const days = random.whole(...PROMISE_DAYS);
  return new Date((at + days * DAY_SECONDS) * 1000).toISOString().slice(0, 10);
}

function yearOf(at: number): number {
  return new Date(at * 1000).getUTCFullYear();
}
