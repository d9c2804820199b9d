import type { CastMember } from "@/lib/demo/cast";
import type { DemoShift } from "@/lib/demo/shifts";
import {
  ask,
  type Bench,
  type Hall,
  idle,
  otherWork,
  type Stretch,
  spend,
  tap,
} from "@/lib/simulation/bench";
import { breaksOf } from "@/lib/simulation/breaks";
import { type InHand, takeJob } from "@/lib/simulation/floor";
import { currentStep } from "@/lib/simulation/traveller";
import { doJob, itemOf } from "@/lib/simulation/work";

/** Chances in one shift or after one job. */
const IS_LATE = 0.08;
const CLEANS = 0.8;
const DOES_OTHER_WORK = 0.13;
const LEAD_DOES_OTHER_WORK = 0.5;
const FORGETS_TO_TAP = 0.03;

const LEAD_WORK = ["meeting", "training", "jigs", "waiting-material", "prototype"];
const WAITS = ["waiting-material", "waiting-material", "cleaning", "tool-care", "training"];

/** One shift of one person from coming in to going home. */
export function* shiftOf(hall: Hall, person: CastMember, shift: DemoShift): Stretch {
  const { random, troubles } = hall;
  const endsAt = shift.end + random.whole(-40, 330);
  const cleansFor = random.chance(CLEANS) ? random.whole(7, 12) * 60 : 0;
  const bench: Bench = {
    hall,
    person,
    shift,
    at: arrival(hall, shift),
    stopAt: endsAt - cleansFor,
    breaks: breaksOf(shift, random),
    cautioned: new Set(),
    cell: person.cell,
  };
  yield bench.at;
  const start = tap(bench, { kind: "shift-start" });
  yield* meet(bench);
  settleQuestions(bench);
  while (bench.at < bench.stopAt) yield* oneThing(bench);
  if (!troubles.forgetsToEnd(shift)) yield* goHome(bench, endsAt);
  else ask(bench, `no-shift-end:${start}`, `end-at:${toldEnd(bench)}`);
}

function arrival({ random }: Hall, { start }: DemoShift): number {
  const seconds = random.chance(IS_LATE) ? random.whole(90, 1_100) : -random.whole(40, 620);
  return start + seconds;
}

/** Monday begins with a meeting of the cell. */
function* meet(bench: Bench): Stretch {
  const { random } = bench.hall;
  const isMonday = new Date(bench.shift.workOn).getUTCDay() === 1;
  if (isMonday && bench.shift.start - bench.at > -600) {
    yield* otherWork(bench, random.whole(12, 20), "meeting");
  }
}

/** What the person will say when asked: the planned end, or just after the last tap. */
function toldEnd({ shift, at }: Bench): string {
  return new Date(Math.max(shift.end, at + 60) * 1000).toISOString();
}

/** A question is looked at on the next day at the soonest. */
const NEXT_DAY_SECONDS = 10 * 3_600;

/** A lead answers what has come up in the own cells and is not left open for the visitor. */
function settleQuestions({ hall, person, shift, cell, ...bench }: Bench): void {
  const { questions, troubles, record, random } = hall;
  let at = bench.at;
  const mine = questions.filter(
    (question) =>
      person.leads.includes(question.cell) &&
      at - question.from > NEXT_DAY_SECONDS &&
      troubles.isSettled(question.from),
  );
  for (const question of mine) {
    const { worker, end, answer } = question;
    const body = { kind: "settle", end, answer } as const;
    record.tap({ at, cell, worker, by: person.number, shift: shift.start, body });
    at += random.whole(8, 20);
    questions.splice(questions.indexOf(question), 1);
  }
}

/** One job, other work, or waiting for something to do. */
function* oneThing(bench: Bench): Stretch {
  const { hall, person } = bench;
  const { random, troubles } = hall;
  yield* idle(
    bench,
    random.chance(FORGETS_TO_TAP) ? random.whole(240, 900) : random.whole(15, 110),
  );
  if (bench.at >= bench.stopAt) return;
  const early = findAhead(bench);
  if (troubles.isDown(person.cell, bench.at)) {
    yield* otherWork(bench, random.whole(20, 45), "machine-down");
  } else if (early && troubles.isHasty(person.cell, bench.at)) {
    yield* tooSoon(bench, early);
  } else if (random.chance(person.leads.length > 0 ? LEAD_DOES_OTHER_WORK : DOES_OTHER_WORK)) {
    const code = person.leads.length > 0 ? random.pick(LEAD_WORK) : undefined;
    yield* otherWork(bench, random.whole(14, 45), code);
  } else {
    yield* nextJob(bench);
  }
}

function* nextJob(bench: Bench): Stretch {
  const { hall, person } = bench;
  const job = takeJob(hall.open, person, bench.at, hall.random);
  if (job) yield* doJob(bench, job);
  else yield* otherWork(bench, hall.random.whole(15, 30), hall.random.pick(WAITS));
}

/** A ticket whose next operation is of the own cell while the one before is in other hands. */
function findAhead({ hall, person }: Bench): InHand | null {
  for (const traveller of hall.open) {
    const step = traveller.steps[traveller.current + 1];
    const isInWork = (currentStep(traveller)?.crew.size ?? 0) > 0;
    if (step?.operation.cell === person.cell && isInWork) return { traveller, step };
  }
  return null;
}

/** Takes up a ticket before its time, and is sent away again. */
function* tooSoon(bench: Bench, early: InHand): Stretch {
  bench.cell = early.step.operation.cell;
  const items = [itemOf(early)];
  tap(bench, { kind: "work", activity: "run", items });
  yield* spend(bench, bench.hall.random.whole(600, 1_500));
  tap(bench, { kind: "pause", items });
}

/** Sweeps the bench and ends the shift at the kiosk of the own cell. */
function* goHome(bench: Bench, endsAt: number): Stretch {
  bench.breaks = [];
  bench.stopAt = endsAt;
  if (bench.cell !== bench.person.cell) bench.at += bench.hall.random.whole(25, 90);
  bench.cell = bench.person.cell;
  const left = endsAt - bench.at;
  if (left > 60) yield* otherWork(bench, left / 60, "cleaning");
  tap(bench, { kind: "shift-end" });
}
