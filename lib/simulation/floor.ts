import type { CastMember } from "@/lib/demo/cast";
import type { CellName } from "@/lib/demo/cells";
import type { Random } from "@/lib/demo/random";
import { currentStep, type Step, type Traveller } from "@/lib/simulation/traveller";

/** One ticket operation in somebody's hands. */
export interface InHand {
  traveller: Traveller;
  step: Step;
}

/** What someone takes up next: one ticket operation, or several at once. */
export interface Job {
  cell: CellName;
  activity: "run" | "inspect" | "rework";
  inHand: readonly InHand[];
}

/** More pieces than this nobody takes in hand at once. */
const TOGETHER_PIECES_MAX = 8;
/** A second person joins where at least so many pieces are left. */
const JOIN_PIECES = 4;
/** A neighbour lends a hand where at least so many tickets wait. */
const LEND_AT = 2;

/**
 * Finds the next job for someone at an instant, in the own cell first, then with the neighbours where
 * work has piled up; null where there is nothing to do. What it gives is the person's from then on.
 */
export function takeJob(
  open: readonly Traveller[],
  person: CastMember,
  at: number,
  random: Random,
): Job | null {
  const own = waitingIn(open, person.cell, at);
  if (own.length > 0) return begin(own, person, random);
  for (const cell of person.also) {
    const waiting = waitingIn(open, cell, at);
    if (waiting.length >= LEND_AT) return begin(waiting, person, random);
  }
  return null;
}

/** The ticket operations of a cell that someone could take up or join, in order of their due dates. */
export function waitingIn(open: readonly Traveller[], cell: CellName, at: number): InHand[] {
  const waiting: InHand[] = [];
  for (const traveller of open) {
    const step = currentStep(traveller);
    if (step?.operation.cell !== cell || traveller.readyAt > at || !isFree(step)) continue;
    waiting.push({ traveller, step });
  }
  return waiting.sort((a, b) => (a.traveller.dueOn < b.traveller.dueOn ? -1 : 1));
}

function isFree({ crew, toDo, toRework, operation }: Step): boolean {
  if (crew.size === 0) return toDo.length + toRework > 0;
  return crew.size === 1 && operation.together === 1 && toDo.length >= JOIN_PIECES;
}

/**
 * What was left lying goes on first, then what must be put right, then one of the most urgent that
 * nobody is on; where there is none, a second person joins.
 */
function begin(waiting: readonly InHand[], person: CastMember, random: Random): Job {
  const free = waiting.filter(({ step }) => step.crew.size === 0);
  const first =
    waiting.find(({ step }) => step.lastWorker === person.number) ??
    waiting.find(({ step }) => step.toDo.length === 0) ??
    random.pick((free.length > 0 ? free : waiting).slice(0, 3));
  const { operation, toDo } = first.step;
  const activity = toDo.length === 0 ? "rework" : operation.activity;
  const inHand = activity === "run" ? withMore(first, waiting) : [first];
  for (const { step } of inHand) step.crew.add(person.number);
  return { cell: operation.cell, activity, inHand };
}

/** Racks and pairs of machines: untouched tickets of the same operation go along. */
function withMore(first: InHand, waiting: readonly InHand[]): InHand[] {
  const { code, together } = first.step.operation;
  const taken = [first];
  let pieces = first.step.toDo.length;
  for (const other of waiting) {
    if (taken.length === together || other === first) continue;
    const { operation, crew, toDo } = other.step;
    const fits = operation.code === code && crew.size === 0 && toDo.length > 0;
    if (!fits || pieces + toDo.length > TOGETHER_PIECES_MAX) continue;
    taken.push(other);
    pieces += toDo.length;
  }
  return taken;
}
