import { cautionVersion } from "@/lib/bench/cautions";
import { faultAt } from "@/lib/demo/faults";
import { stepsOf } from "@/lib/demo/steps";
import type { Item } from "@/lib/ledger/schema";
import { ask, type Bench, idle, otherWork, type Stretch, spend, tap } from "@/lib/simulation/bench";
import { type InHand, type Job, waitingIn } from "@/lib/simulation/floor";
import type { Stint } from "@/lib/simulation/tempo";
import { countPieces, openPieces } from "@/lib/simulation/traveller";
import { sum } from "@/lib/sum";

/** Two machines or a rack: a piece takes this share of its time alone. */
const TOGETHER_SHARE = 0.92;
/** A lot of so many pieces is sometimes counted halfway. */
const COUNT_PIECES = 4;

/** Chances at one job. */
const COUNTS_HALFWAY = 0.15;
const IS_CALLED_AWAY = 0.035;
const TAPS_LATE = 0.02;
const UNDOES = 0.008;
const SCANS_WRONG = 0.0008;
const OVER_COUNTS = 0.0005;
const OBJECTS = 0.0008;

/** Does a job from the first tap to the count, or as far as the shift lets it. */
export function* doJob(bench: Bench, job: Job): Stretch {
  bench.cell = job.cell;
  answerCaution(bench, job);
  const isReady = yield* setUp(bench, job);
  if (isReady) yield* run(bench, job);
  for (const { step } of job.inHand) {
    step.crew.delete(bench.person.number);
    step.lastWorker = step.toDo.length > 0 ? bench.person.number : null;
  }
}

/** What can hurt is answered once in a shift, before the first tap of the operation. */
function answerCaution(bench: Bench, { inHand }: Job): void {
  const { code: operation, hazards } = inHand[0]!.step.operation;
  if (hazards.length === 0 || bench.cautioned.has(operation)) return;
  bench.cautioned.add(operation);
  tap(bench, { kind: "caution-read", operation, version: cautionVersion(hazards) });
}

/** Make-ready for those that need it; false if the shift ended over it. */
function* setUp(bench: Bench, job: Job): Stretch<boolean> {
  const due = job.inHand.filter(({ step }) => !step.isSetUp && job.activity === "run");
  if (due.length === 0) return true;
  tap(bench, { kind: "work", activity: "setup", items: due.map(itemOf) });
  const left = yield* spend(bench, bench.hall.tempo.setupSeconds(stintOf(bench, due[0]!)));
  for (const { step } of due) step.isSetUp = left === 0;
  return left === 0;
}

function* run(bench: Bench, job: Job): Stretch {
  yield* misTap(bench, job);
  const event = beginWork(bench, job);
  const done = new Map(job.inHand.map(({ step }) => [step, 0]));
  let wrong = event.isWrong;
  for (let next = pieceOf(job); next; next = pieceOf(job)) {
    if ((yield* workOn(bench, job, next)) === "shift over") break;
    done.set(next.step, done.get(next.step)! + 1);
    if (wrong) {
      tap(bench, { kind: "reassign", event: event.id, items: job.inHand.map(itemOf) });
      wrong = false;
    }
    yield* betweenPieces(bench, job, done);
  }
  countAll(bench, job, done);
}

/** The work tap: now and then said to have begun earlier, or on a ticket that was not meant. */
function beginWork(bench: Bench, job: Job): { id: string; isWrong: boolean } {
  const { random, open } = bench.hall;
  const { activity } = job;
  const other = waitingIn(open, job.cell, bench.at).find(
    ({ step, traveller }) =>
      step.operation.code === job.inHand[0]!.step.operation.code &&
      job.inHand.every((each) => each.traveller !== traveller),
  );
  const isWrong =
    other !== undefined &&
    job.inHand.length === 1 &&
    activity === "run" &&
    random.chance(SCANS_WRONG);
  const items = isWrong ? [itemOf(other)] : job.inHand.map(itemOf);
  if (!isWrong && random.chance(TAPS_LATE)) {
    const from = bench.at + 2;
    bench.at += random.whole(180, 900);
    const since = new Date(from * 1000).toISOString();
    return { id: tap(bench, { kind: "work", activity, items, since }), isWrong };
  }
  return { id: tap(bench, { kind: "work", activity, items }), isWrong };
}

/** The next piece in the job's hands, taken off the pile. */
function pieceOf({ inHand, activity }: Job): (InHand & { share: number }) | null {
  for (const { traveller, step } of inHand) {
    if (activity === "rework" ? step.toRework === 0 : step.toDo.length === 0) continue;
    const share = activity === "rework" ? 1 : step.toDo.shift()!;
    if (activity === "rework") step.toRework -= 1;
    step.inHand += 1;
    return { traveller, step, share };
  }
  return null;
}

function* workOn(
  bench: Bench,
  { activity, inHand }: Job,
  piece: InHand & { share: number },
): Stretch<"done" | "shift over"> {
  const { tempo } = bench.hall;
  const stint = stintOf(bench, piece);
  const whole = activity === "rework" ? tempo.reworkSeconds(stint) : tempo.pieceSeconds(stint);
  const seconds = whole * (inHand.length > 1 ? TOGETHER_SHARE : 1);
  const left = yield* spendOn(bench, piece, seconds);
  if (left === 0) return "done";
  piece.step.inHand -= 1;
  if (activity === "rework") piece.step.toRework += 1;
  else piece.step.toDo.unshift(Math.min(1, left / seconds));
  return "shift over";
}

/**
 * Lets a piece's time go by; on a single instrument that is built in steps each is tapped off as it is
 * done, also where others were done in a shift before.
 *
 * @returns the seconds that were left when the shift came to its end; 0 if all went by
 */
function* spendOn(
  bench: Bench,
  piece: InHand & { share: number },
  seconds: number,
): Stretch<number> {
  const { traveller, step, share } = piece;
  const { code: operation } = step.operation;
  const steps = traveller.quantity === 1 ? stepsOf(traveller.model, operation) : [];
  const whole = sum(steps.map(({ minutes }) => minutes));
  let [before, done] = [0, 1 - share];
  for (const each of steps) {
    before += each.minutes / whole;
    if (before <= done + ALMOST) continue;
    const left = yield* spend(bench, (before - done) * seconds);
    if (left > 0) return left + (1 - before) * seconds;
    done = before;
    tap(bench, { kind: "step-done", ticket: traveller.number, operation, step: each.step });
  }
  return steps.length > 0 ? 0 : yield* spend(bench, seconds * share);
}

/** Shares are fractions that do not quite sum to one. */
const ALMOST = 1e-6;

/** A count that lets the work run on, or a call away from the bench and back. */
function* betweenPieces(bench: Bench, job: Job, done: Map<InHand["step"], number>): Stretch {
  const { random } = bench.hall;
  const only = job.inHand[0]!;
  if (job.activity !== "run" || job.inHand.length > 1 || only.step.toDo.length === 0) return;
  if (done.get(only.step)! >= COUNT_PIECES && random.chance(COUNTS_HALFWAY)) {
    report(bench, only, done.get(only.step)!, false);
    done.set(only.step, 0);
  } else if (random.chance(IS_CALLED_AWAY)) {
    yield* otherWork(bench, random.whole(6, 22), random.pick(["waiting-lead", "jigs", "training"]));
    tap(bench, { kind: "work", activity: "run", items: job.inHand.map(itemOf) });
  }
}

/** Counts what was done of each ticket, and lays down what somebody else finished meanwhile. */
function countAll(bench: Bench, job: Job, done: Map<InHand["step"], number>): void {
  // an inspector lays a piece down before passing or failing it: the verdict itself ends no work
  const isInspected = job.inHand.some(({ step }) => step.operation.activity === "inspect");
  const isNothing = [...done.values()].every((pieces) => pieces === 0);
  if (isInspected || (isNothing && bench.at < bench.stopAt)) {
    tap(bench, { kind: "pause", items: job.inHand.map(itemOf) });
  }
  for (const each of job.inHand) {
    const pieces = done.get(each.step)!;
    if (pieces > 0) report(bench, each, pieces, true);
  }
}

/** Counts pieces, in the ledger and on the floor. */
function report(bench: Bench, { traveller, step }: InHand, pieces: number, stop: boolean): void {
  const { operation } = step;
  const { random, troubles } = bench.hall;
  const at = bench.at;
  const count = countOf(bench, { traveller, step }, pieces);
  const miscounts = stop && openPieces(step) === pieces && random.chance(OVER_COUNTS);
  const head = { ticket: traveller.number, operation: operation.code, ...count };
  const counted = miscounts ? { ...head, good: head.good + 1 } : head;
  const fault = count.good < pieces ? faultOf(bench, { traveller, step }) : {};
  const id =
    operation.activity === "inspect"
      ? tap(bench, { kind: "inspect", ...counted, ...fault })
      : tap(bench, { kind: "report", ...counted, stop, ...fault });
  const restsSeconds = troubles.restsSeconds(traveller, operation, at);
  countPieces(traveller, step, { ...count, at: bench.at, restsSeconds });
  if (traveller.endedAt !== null) bench.hall.ended.push(traveller);
  if (random.chance(OBJECTS))
    ask(bench, `objection:${tap(bench, { kind: "object", subject: id })}`);
}

function countOf(bench: Bench, { traveller, step }: InHand, pieces: number) {
  const { troubles, tempo } = bench.hall;
  const count = { good: 0, rework: 0, scrap: 0 };
  for (let piece = 0; piece < pieces; piece += 1) {
    const mustFail = troubles.mustFail(traveller, step.operation, bench.at);
    const outcome = mustFail ? "rework" : tempo.outcome(stintOf(bench, { traveller, step }));
    count[outcome] += 1;
  }
  return count;
}

function faultOf(bench: Bench, { traveller, step }: InHand) {
  const behind = traveller.steps.slice(0, traveller.current + 1).map((each) => each.operation.code);
  const { causedBy, defect } = faultAt(step.operation, behind, bench.hall.random);
  return { causedBy, defects: [defect] };
}

/** Now and then the wrong operation is tapped first and undone at once. */
function* misTap(bench: Bench, job: Job): Stretch {
  const { random, open } = bench.hall;
  if (!random.chance(UNDOES)) return;
  const other = waitingIn(open, job.cell, bench.at).find(
    ({ traveller }) => traveller !== job.inHand[0]!.traveller,
  );
  if (!other) return;
  const event = tap(bench, { kind: "work", activity: "run", items: [itemOf(other)] });
  yield* idle(bench, 3);
  tap(bench, { kind: "undo", event });
}

/** The item of an event for what is in hand. */
export function itemOf({ traveller, step }: InHand): Item {
  return { ticket: traveller.number, operation: step.operation.code };
}

function stintOf(bench: Bench, { traveller, step }: InHand): Stint {
  return {
    model: traveller.model,
    option: traveller.option,
    operation: step.operation,
    worker: bench.person.number,
    day: bench.hall.dayOf(bench.at),
  };
}
