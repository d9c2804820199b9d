import { assert } from "@/lib/assert";
import type { DemoCalendar, DemoDay } from "@/lib/demo/calendar";
import type { CellName } from "@/lib/demo/cells";
import type { DemoOperation } from "@/lib/demo/operations";
import type { DemoShift } from "@/lib/demo/shifts";
import type { CutOff } from "@/lib/simulation/record";
import { dayOf } from "@/lib/simulation/release";
import type { Traveller } from "@/lib/simulation/traveller";

/** What goes wrong in the history, on purpose, so that every screen has something to show. */
export interface Troubles {
  /** Somebody walked home without ending the shift. */
  forgetsToEnd(shift: DemoShift): boolean;
  /** The machines of the cell stand still. */
  isDown(cell: CellName, at: number): boolean;
  /** Seconds for which a ticket rests after an operation: one was taken off the rack too early. */
  restsSeconds(traveller: Traveller, operation: DemoOperation, at: number): number;
  /** A piece that must fail here, whatever the odds. */
  mustFail(traveller: Traveller, operation: DemoOperation, at: number): boolean;
  /** Somebody takes up a ticket whose operation before is still in other hands. */
  isHasty(cell: CellName, at: number): boolean;
  /** What came up then has been settled; later questions are still open. */
  isSettled(from: number): boolean;
  cutOffs: readonly CutOff[];
}

/** Days before today on which someone forgot to end the shift; the last is still to be settled. */
const FORGOTTEN_DAYS = [2, 6, 13, 27, 41];
/** The clear coat that was cut back a day after it was sprayed, so many days before today. */
const TOO_EARLY = { days: 12, operation: "390", restsHours: 20, failsAt: "410" };
/** The instrument that came back from the finish check again and again. */
const LOOP = { days: 20, model: "Avocet", operation: "420", times: 3 };
const HASTY = { cell: "Binding", days: [3, 17] };
const DOWN = { cell: "CNC", days: 15, fromMinutes: 560, toMinutes: 740 };
const CUT_OFF = { cell: "Spray", days: 8, fromMinutes: 600, toMinutes: 715 } as const;

const OPEN_DAYS = 5;

const HOUR = 3_600;

/** Plans the troubles of a calendar; what happened to which ticket is kept inside. */
export function troublesOf(calendar: DemoCalendar, shifts: readonly DemoShift[]): Troubles {
  const forgotten = forgottenShifts(calendar, shifts);
  const early = new Set<string>();
  const loop = { ticket: "", times: 0 };
  const hasty = new Set(HASTY.days.map((days) => weekdayBefore(calendar, days).index));
  const [downFrom, downTo] = [minuteOf(calendar, DOWN), minuteOf(calendar, DOWN, "toMinutes")];
  return {
    forgetsToEnd: (shift) => forgotten.has(shift),
    isDown: (cell, at) => cell === DOWN.cell && downFrom <= at && at < downTo,
    restsSeconds(traveller, { code, restsHours }, at) {
      const isIt = code === TOO_EARLY.operation && traveller.lot > 1 && early.size === 0;
      if (!isIt || dayOf(calendar, at) < calendar.today - TOO_EARLY.days) return restsHours * HOUR;
      early.add(traveller.number);
      return TOO_EARLY.restsHours * HOUR;
    },
    mustFail({ number, model }, { code }, at) {
      if (early.has(number) && code === TOO_EARLY.failsAt) return early.delete(number);
      const isLate = dayOf(calendar, at) >= calendar.today - LOOP.days;
      if (!isLate || model.name !== LOOP.model || code !== LOOP.operation) return false;
      if (loop.ticket === "") loop.ticket = number;
      if (loop.ticket !== number || loop.times === LOOP.times) return false;
      loop.times += 1;
      return true;
    },
    isHasty(cell, at) {
      return cell === HASTY.cell && hasty.delete(dayOf(calendar, at));
    },
    isSettled: (from) => dayOf(calendar, from) < calendar.today - OPEN_DAYS,
    cutOffs: [
      {
        cell: CUT_OFF.cell,
        fromMs: minuteOf(calendar, CUT_OFF) * 1000,
        toMs: minuteOf(calendar, CUT_OFF, "toMinutes") * 1000,
      },
    ],
  };
}

/** On each of the days, or the first before it with a day shift: somebody of that shift. */
function forgottenShifts(calendar: DemoCalendar, shifts: readonly DemoShift[]): Set<DemoShift> {
  const found = FORGOTTEN_DAYS.flatMap((days, at) => {
    const candidates = shifts.filter(
      ({ day, attends, end }) => attends && day >= 0 && day <= calendar.today - days && end > 0,
    );
    const last = Math.max(...candidates.map(({ day }) => day));
    const thatDay = candidates.filter(({ day }) => day === last);
    return thatDay[(at * 11 + 5) % thatDay.length] ?? [];
  });
  return new Set(found);
}

/** The epoch second of a minute of a weekday. */
function minuteOf(
  calendar: DemoCalendar,
  when: { days: number; fromMinutes: number; toMinutes: number },
  minutes: "fromMinutes" | "toMinutes" = "fromMinutes",
): number {
  return weekdayBefore(calendar, when.days).at(when[minutes]);
}

/** The day so many days before today; a weekend moves it to the Friday before. */
function weekdayBefore(calendar: DemoCalendar, days: number): DemoDay {
  const index = calendar.today - days;
  const day = calendar.days.findLast((each) => each.index <= index && each.weekday <= 5);
  assert(day !== undefined, "the calendar begins with weeks before the history");
  return day;
}
