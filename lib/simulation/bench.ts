import type { CastMember } from "@/lib/demo/cast";
import { type CellName, cells } from "@/lib/demo/cells";
import type { Random } from "@/lib/demo/random";
import type { DemoShift } from "@/lib/demo/shifts";
import type { EventBody } from "@/lib/ledger/schema";
import type { PlannedBreak } from "@/lib/simulation/breaks";
import type { Record } from "@/lib/simulation/record";
import type { Tempo } from "@/lib/simulation/tempo";
import type { Traveller } from "@/lib/simulation/traveller";
import type { Troubles } from "@/lib/simulation/trouble";

/** What everyone on the floor shares. */
export interface Hall {
  open: Traveller[];
  /** Those of them that have just come to their end. */
  ended: Traveller[];
  random: Random;
  tempo: Tempo;
  troubles: Troubles;
  record: Record;
  /** What a lead must still look at. */
  questions: Question[];
  /** The day of the history in which an epoch second lies. */
  dayOf(at: number): number;
}

/** A loose end that waits for the lead of somebody's home cell, with the answer it will get. */
interface Question {
  worker: string;
  cell: CellName;
  /** The key of the loose end. */
  end: string;
  answer: string;
  /** Epoch second from which on it can be seen. */
  from: number;
}

/** Someone in a shift: where the person is and how far the time has gone. */
export interface Bench {
  hall: Hall;
  person: CastMember;
  shift: DemoShift;
  /** Epoch second up to which the person has acted. */
  at: number;
  /** No new piece is begun from here on. */
  stopAt: number;
  breaks: PlannedBreak[];
  /** Operations whose caution the person has answered in this shift. */
  cautioned: Set<string>;
  /** The cell whose kiosk the person stands at. */
  cell: CellName;
}

/** A stretch of a shift: yields the epoch seconds at which it wants to be gone on with. */
export type Stretch<T = void> = Generator<number, T, void>;

/** Taps at the kiosk, now; the hand is away from the screen a few seconds later. */
export function tap(bench: Bench, body: EventBody): string {
  const { hall, person, shift, cell, at } = bench;
  const id = hall.record.tap({ at, cell, worker: person.number, shift: shift.start, body });
  bench.at += hall.random.whole(1, 4);
  return id;
}

/**
 * Lets so many seconds of doing go by, with the breaks that fall into them.
 *
 * @returns the seconds that were left when the shift came to its end; 0 if all went by
 */
export function* spend(bench: Bench, seconds: number): Stretch<number> {
  let left = Math.max(1, Math.round(seconds));
  while (true) {
    const next = bench.breaks[0];
    const until = Math.max(bench.at, Math.min(bench.at + left, bench.stopAt, next?.at ?? Infinity));
    left -= until - bench.at;
    bench.at = until;
    yield until;
    if (left <= 0 || bench.at >= bench.stopAt) return Math.max(0, left);
    yield* takeBreak(bench);
  }
}

/** A lead hears of it later: in the cell of the person, under the key of the loose end. */
export function ask(bench: Bench, end: string, answer = "accept"): void {
  const { hall, person, at } = bench;
  hall.questions.push({ worker: person.number, cell: person.cell, end, answer, from: at });
}

/** Meals may last so long at Larkmoor Stringworks. */
export const MEAL_MAX_SECONDS = 75 * 60;

function* takeBreak(bench: Bench): Stretch {
  const next = bench.breaks.shift();
  if (!next) return;
  const event = tap(bench, { kind: "break-start", break: next.kind });
  if (next.seconds > MEAL_MAX_SECONDS) ask(bench, `break-long:${event}`);
  bench.at += next.seconds;
  yield bench.at;
  tap(bench, { kind: "break-end", break: next.kind });
}

/** Other work for so many minutes, under the given code or one that is usual in the home cell. */
export function* otherWork(bench: Bench, minutes: number, code?: string): Stretch {
  const { random } = bench.hall;
  const usual = cells.find(({ name }) => name === bench.person.cell)?.otherWork ?? ["cleaning"];
  tap(bench, { kind: "indirect", code: code ?? random.pick<string>(usual) });
  yield* spend(bench, minutes * 60);
}

/** Minutes in which nothing is booked: reaching for the next ticket, a word with a neighbour. */
export function* idle(bench: Bench, seconds: number): Stretch {
  yield* spend(bench, seconds);
}
