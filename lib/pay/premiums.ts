import type { Premium } from "@/lib/pay/schema";
import { sum } from "@/lib/sum";
import { addDays, listDays, localDate, type Stretch } from "@/lib/time/site-day";
import { overlapOf } from "@/lib/time/stretches";
import { weekdayOf, weekdays } from "@/lib/time/workweek";
import type { ZoneClock } from "@/lib/time/zone-clock";
import type { Piece } from "@/lib/timesheet/attribution";

const MIDNIGHT = "00:00";
const DAY_END = "24:00";

/**
 * The stretches in which a premium holds, as far as they touch `within`: in order, without overlap.
 * A window opens in local time on a weekday of the premium and may close on the next day; a listed
 * date holds whole, from local midnight to midnight. A time that the clocks skip is the instant
 * after the gap, one that comes twice the earlier.
 *
 * @param premiums all of one code: together they are one premium
 */
export function premiumStretches(
  premiums: readonly Premium[],
  within: Stretch,
  clock: ZoneClock,
): Stretch[] {
  const first = addDays(localDate(within.start * 1000, clock.zone), -1);
  const dates = listDays(first, addDays(localDate(within.end * 1000, clock.zone), 1));
  const windows = dates.flatMap((date) =>
    premiums.flatMap((premium) => [
      ...(opensOn(premium, date) ? [windowOf(premium, date, clock)] : []),
      ...(premium.dates.includes(date) ? [wholeDay(date, clock)] : []),
    ]),
  );
  return merged(windows.map((window) => overlapOf(window, within)));
}

/** The seconds of some pieces that lie in stretches, none counted twice. */
export function secondsIn(pieces: readonly Piece[], stretches: readonly Stretch[]): number {
  return sum(
    pieces.flatMap((piece) =>
      stretches.map((stretch) => {
        const { start, end } = overlapOf(piece, stretch);
        return Math.max(0, end - start);
      }),
    ),
  );
}

function opensOn({ from, to, days, dates }: Premium, date: string): boolean {
  const isWindow = from !== undefined || to !== undefined || dates.length === 0;
  return (days ?? (isWindow ? weekdays : [])).includes(weekdayOf(date));
}

function windowOf({ from = MIDNIGHT, to = DAY_END }: Premium, date: string, clock: ZoneClock) {
  const isSameDay = to > from && to !== DAY_END;
  const closes = to === DAY_END ? MIDNIGHT : to;
  return {
    start: clock.secondOf(date, from),
    end: clock.secondOf(isSameDay ? date : addDays(date, 1), closes),
  };
}

function wholeDay(date: string, clock: ZoneClock): Stretch {
  return windowOf({ code: "", dates: [] }, date, clock);
}

function merged(stretches: readonly Stretch[]): Stretch[] {
  const inOrder = stretches
    .filter(({ start, end }) => end > start)
    .toSorted((a, b) => a.start - b.start);
  const apart: Stretch[] = [];
  for (const { start, end } of inOrder) {
    const last = apart.at(-1);
    if (last && start <= last.end) last.end = Math.max(last.end, end);
    else apart.push({ start, end });
  }
  return apart;
}
