import { calendarAt, type DemoCalendar } from "@/lib/demo/calendar";
import { type CastMember, cast } from "@/lib/demo/cast";
import { type Random, randomFrom } from "@/lib/demo/random";
import { type DemoShift, plannedShifts } from "@/lib/demo/shifts";
import type { Hall, Stretch } from "@/lib/simulation/bench";
import { type DemoEvent, type DemoSession, recordOf } from "@/lib/simulation/record";
import { dayOf, type Releaser, releaserOf } from "@/lib/simulation/release";
import { shiftOf } from "@/lib/simulation/shift";
import { tempoOf } from "@/lib/simulation/tempo";
import { freshStep, type Traveller } from "@/lib/simulation/traveller";
import { troublesOf } from "@/lib/simulation/trouble";

/** How many tickets are on the floor at any time: one that ends lets the next one in. */
const OPEN_TICKETS = 180;
/** The tickets that are on the floor at first were released over so many days before. */
const LEAD_DAYS = 42;

/** What happened at Larkmoor Stringworks, as the ledger and the tables take it. */
export interface DemoRun {
  calendar: DemoCalendar;
  shifts: DemoShift[];
  tickets: Traveller[];
  sessions: DemoSession[];
  /** In the order in which they were tapped. */
  events: DemoEvent[];
}

/** A whole scenario, or for a test a slice of it. */
export interface Scenario {
  nowMs: number;
  weeks?: number;
  people?: readonly CastMember[];
  openTickets?: number;
}

/**
 * Plays the history of Larkmoor Stringworks up to an instant: the same for the same instant. A shift is
 * running at any hour, and nothing of it lies after that instant. Tickets that were on the floor when
 * the history began have only the operations that were then still before them.
 */
export function simulate({ nowMs, weeks, people = cast, openTickets }: Scenario): DemoRun {
  const calendar = calendarAt(nowMs, weeks);
  const random = randomFrom(`larkmoor ${calendar.endsAt}`);
  const shifts = plannedShifts(calendar, people);
  const releaser = releaserOf(calendar, random);
  const troubles = troublesOf(calendar, shifts);
  const hall: Hall = {
    open: ticketsOnTheFloor(calendar, releaser, openTickets ?? OPEN_TICKETS, random),
    ended: [],
    random,
    tempo: tempoOf(random),
    troubles,
    record: recordOf(random, []),
    questions: [],
    dayOf: (at) => dayOf(calendar, at),
  };
  const before = shifts.filter(({ end }) => end <= calendar.startsAt);
  play({ ...hall, shifts: before, people, releaser, until: calendar.startsAt });
  const begun = hall.open.map(asOnTheFirstDay);
  const record = recordOf(random, troubles.cutOffs);
  const after = shifts.filter(({ start }) => start >= calendar.startsAt);
  const open = [...begun];
  const released = play({
    ...hall,
    open,
    record,
    shifts: after,
    people,
    releaser,
    until: calendar.endsAt,
  });
  return { calendar, shifts: after, tickets: [...begun, ...released], ...record.until(nowMs) };
}

/** The first tickets, spread evenly over the routing; the older have the lower numbers. */
function ticketsOnTheFloor(
  calendar: DemoCalendar,
  releaser: Releaser,
  count: number,
  random: Random,
): Traveller[] {
  const opensAt = calendar.days[0]!.at(0);
  return Array.from({ length: count }, (_, at) => {
    const done = 1 - (at + random.next()) / count;
    return releaser.release(opensAt - Math.round(done * LEAD_DAYS * 86_400), done);
  });
}

/** What is left of a ticket when the history begins: pieces and operations that are still to do. */
function asOnTheFirstDay(ticket: Traveller): Traveller {
  const [first, ...later] = ticket.steps.slice(ticket.current);
  if (!first) throw new RangeError("asOnTheFirstDay: an open ticket has an operation before it");
  const steps = [freshStep(first.operation, ticket.quantity), ...later];
  return { ...ticket, steps, current: 0, lot: ticket.quantity };
}

interface Play extends Hall {
  shifts: readonly DemoShift[];
  people: readonly CastMember[];
  releaser: Releaser;
  until: number;
}

/** Nobody comes earlier than that before the shift. */
const EARLY_SECONDS = 1_200;

/**
 * Plays the shifts, always going on with whoever acts next, until an epoch second; a ticket that ends
 * lets the next one in. Answers the tickets that were let in.
 */
function play(hall: Play): Traveller[] {
  const released: Traveller[] = [];
  const coming = hall.shifts.filter(({ attends }) => attends).sort((a, b) => a.start - b.start);
  const running: Running[] = [];
  for (let next = nextUp(hall, coming, running); next; next = nextUp(hall, coming, running)) {
    const { value, done } = next.stretch.next();
    if (!done && value <= hall.until) insert(running, { at: value, stretch: next.stretch });
    released.push(...replaceEnded(hall, next.at));
  }
  return released;
}

interface Running {
  /** The epoch second at which it goes on. */
  at: number;
  stretch: Stretch;
}

/** Who acts next: somebody who is in, or the next one to come in; undefined when it is over. */
function nextUp(hall: Play, coming: DemoShift[], running: Running[]): Running | undefined {
  const at = (coming[0]?.start ?? Number.POSITIVE_INFINITY) - EARLY_SECONDS;
  if (coming[0] && at <= Math.min(hall.until, running[0]?.at ?? hall.until)) {
    return { at, stretch: stretchOf(hall, coming.shift()!) };
  }
  return running.shift();
}

function stretchOf(hall: Play, shift: DemoShift): Stretch {
  const person = hall.people.find(({ number }) => number === shift.worker);
  if (!person) throw new RangeError(`play: nobody has the number ${shift.worker}`);
  return shiftOf(hall, person, shift);
}

/** Keeps the queue in order; of two at the same second the one that came first goes first. */
function insert(
  queue: { at: number; stretch: Stretch }[],
  entry: { at: number; stretch: Stretch },
) {
  let [low, high] = [0, queue.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (queue[middle]!.at <= entry.at) low = middle + 1;
    else high = middle;
  }
  queue.splice(low, 0, entry);
}

function replaceEnded({ open, ended, releaser }: Play, at: number): Traveller[] {
  return ended.splice(0).map((traveller) => {
    const next = releaser.release(at);
    open[open.indexOf(traveller)] = next;
    return next;
  });
}
