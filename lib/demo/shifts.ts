import type { DemoCalendar, DemoDay } from "@/lib/demo/calendar";
import type { CastMember, Pattern } from "@/lib/demo/cast";
import { randomFrom } from "@/lib/demo/random";

/** A shift that someone is planned for; `attends` is false where the person fell ill. */
export interface DemoShift {
  worker: string;
  workOn: string;
  /** Index of the day on which it starts. */
  day: number;
  /** Epoch seconds. */
  start: number;
  end: number;
  attends: boolean;
}

/** Minutes after the midnight of the day on which the shift starts. */
const hours: Record<Pattern, { start: number; end: number; weekdays: readonly number[] }> = {
  day: { start: 390, end: 900, weekdays: [1, 2, 3, 4, 5] },
  evening: { start: 885, end: 1395, weekdays: [1, 2, 3, 4, 5] },
  night: { start: 1365, end: 1860, weekdays: [7, 1, 2, 3, 4, 5] },
  "weekend-day": { start: 410, end: 1145, weekdays: [6, 7] },
  "weekend-night": { start: 1130, end: 1865, weekdays: [5, 6, 7] },
};

const SICK_SHARE = 0.035;
/** How many of the cast have one week of holiday in the scenario. */
const HOLIDAY_SHARE = 0.4;

/**
 * Plans everyone's shifts over the calendar. Someone is always in: of the small crews, night and
 * weekend, no more than one is away at a time and nobody takes a holiday.
 */
export function plannedShifts(calendar: DemoCalendar, people: readonly CastMember[]): DemoShift[] {
  // safe because the keys of the table above are the patterns
  const patterns = Object.keys(hours) as Pattern[];
  return patterns.flatMap((pattern) => {
    const crew = people.filter((person) => person.pattern === pattern);
    return calendar.days.flatMap((day) => crewShifts(day, pattern, crew, calendar));
  });
}

function crewShifts(
  day: DemoDay,
  pattern: Pattern,
  crew: readonly CastMember[],
  calendar: DemoCalendar,
): DemoShift[] {
  const { start, end, weekdays } = hours[pattern];
  if (!weekdays.includes(day.weekday)) return [];
  const isSmall = pattern !== "day" && pattern !== "evening";
  const planned = crew.filter(
    (person, at) =>
      !(pattern === "night" && isNightOff(at, day)) &&
      !(isHoliday(person, day, calendar) && !isSmall),
  );
  const luck = randomFrom(`sick ${day.date} ${pattern}`);
  const away = isSmall ? [awayFromSmallCrew(planned, luck)] : planned.map(sickWith(luck));
  const bounds = { start: day.at(start), end: day.at(end) };
  return planned.map(({ number }) => ({
    worker: number,
    workOn: day.date,
    day: day.index,
    ...bounds,
    attends: !away.includes(number),
  }));
}

/** Five of the six nights each: the first of the crew is off on Monday night, the next on Tuesday. */
function isNightOff(at: number, day: DemoDay): boolean {
  return day.weekday === (at % 5) + 1;
}

function isHoliday({ number }: CastMember, day: DemoDay, calendar: DemoCalendar): boolean {
  const luck = randomFrom(`holiday ${number}`);
  if (!luck.chance(HOLIDAY_SHARE)) return false;
  const week = luck.whole(0, Math.floor(calendar.today / 7) - 1);
  return Math.floor(day.index / 7) === week;
}

function sickWith(luck: ReturnType<typeof randomFrom>) {
  return ({ number }: CastMember) => (luck.chance(SICK_SHARE) ? number : null);
}

function awayFromSmallCrew(planned: readonly CastMember[], luck: ReturnType<typeof randomFrom>) {
  return planned.length > 2 && luck.chance(SICK_SHARE * planned.length)
    ? luck.pick(planned).number
    : null;
}
