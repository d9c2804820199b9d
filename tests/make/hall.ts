import { calendarAt } from "@/lib/demo/calendar";
import { type CastMember, cast } from "@/lib/demo/cast";
import type { CellName } from "@/lib/demo/cells";
import { models } from "@/lib/demo/models";
import { routingOf } from "@/lib/demo/operations";
import { randomFrom } from "@/lib/demo/random";
import type { DemoShift } from "@/lib/demo/shifts";
import type { Bench, Hall, Stretch } from "@/lib/simulation/bench";
import { recordOf } from "@/lib/simulation/record";
import { tempoOf } from "@/lib/simulation/tempo";
import { freshStep, type Traveller } from "@/lib/simulation/traveller";
import { troublesOf } from "@/lib/simulation/trouble";

/** A Thursday at 11:20 in Larkmoor. */
const NOW_MS = Date.parse("2026-05-14T16:20:00Z");
export const calendar = calendarAt(NOW_MS);

/** A hall with these tickets in it, where nothing goes wrong on purpose. */
export function makeHall(open: Traveller[] = [], seed = "hall"): Hall {
  const random = randomFrom(seed);
  const troubles = troublesOf(calendar, []);
  return {
    open,
    ended: [],
    random,
    tempo: tempoOf(random),
    troubles: { ...troubles, mustFail: () => false, isHasty: () => false, isDown: () => false },
    record: recordOf(random, []),
    questions: [],
    dayOf: () => 30,
  };
}

/** Somebody of a cell who is no lead. */
export function personOf(cell: CellName): CastMember {
  return cast.find((person) => person.cell === cell && person.leads.length === 0)!;
}

/** A day shift of 8.5 hours on the day before. */
export function makeShift(worker: string): DemoShift {
  const day = calendar.days.find(({ index }) => index === calendar.today - 1)!;
  const [start, end] = [day.at(390), day.at(900)];
  return { worker, workOn: day.date, day: day.index, start, end, attends: true };
}

/** Somebody at a bench, an hour into the shift and without breaks ahead. */
export function makeBench(hall: Hall, person: CastMember): Bench {
  const shift = makeShift(person.number);
  return {
    hall,
    person,
    shift,
    at: shift.start + 3_600,
    stopAt: shift.end,
    breaks: [],
    cautioned: new Set(),
    cell: person.cell,
  };
}

/** A ticket of a model that stands before an operation, ready to be worked on. */
export function makeTraveller(
  of: { number?: string; model?: string; lot?: number; operation?: string; dueOn?: string } = {},
): Traveller {
  const { number = "26038719", lot = 4, operation = "010", dueOn = "2026-06-01" } = of;
  const model = models.find(({ name }) => name === (of.model ?? "Heron"))!;
  const steps = routingOf(model).map((each) => freshStep(each, lot));
  return {
    number,
    model,
    option: model.options[0]!,
    order: "24110",
    dueOn,
    releasedAt: calendar.startsAt,
    lot,
    quantity: lot,
    steps,
    current: steps.findIndex((step) => step.operation.code === operation),
    readyAt: calendar.startsAt,
    endedAt: null,
  };
}

/** Lets a stretch of a shift run to its end and answers what it gave back. */
export function through<T>(stretch: Stretch<T>): T {
  for (let step = stretch.next(); ; step = stretch.next()) if (step.done) return step.value;
}

/** The kinds of the events that the hall recorded, in order. */
export function kindsOf(hall: Hall): string[] {
  return eventsOf(hall).map(({ kind }) => kind);
}

/** The events that the hall recorded, in order. */
export function eventsOf(hall: Hall) {
  return hall.record.until(NOW_MS).events.map(({ event }) => event);
}
