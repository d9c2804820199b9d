import { type Act, isPresence, startsShift } from "@/lib/acts/act";
import { ruleAt } from "@/lib/time/site-day";
import {
  cutAtLastTap,
  isPastDeadline,
  LONGEST_SHIFT_SECONDS,
  type OpenShift,
  openShift,
  plannedEnd,
  segmentsOf,
} from "@/lib/timeline/open-shift";
import type { FoldFacts, LooseEnd, Segment, Shift, Standing } from "@/lib/timeline/schema";
import { endKey, type Settlements } from "@/lib/timeline/settlements";
import { type Ask, askLongBreak, takeEffect } from "@/lib/timeline/within-shift";

/** A record from a kiosk that came later than this was kept while the kiosk was offline. */
const OFFLINE_MS = 60_000;

/** What a walk must know besides the acts; `asOfMs` is epoch milliseconds. */
export interface Way {
  facts: FoldFacts;
  settlements: Settlements;
  asOfMs: number;
}

/** What the acts of one worker come to. */
export interface Walked {
  segments: Segment[];
  shifts: Shift[];
  looseEnds: LooseEnd[];
  standing: Standing | null;
  /** The shift in which each act lies, by the ids of the act and of the shift's start. */
  shiftOf: Map<string, string>;
}

interface State extends Walked {
  way: Way;
  ask: Ask;
  open: OpenShift | null;
  /** When the last shift was ended by a tap or an answer; null where it was not, or none was. */
  leftAt: number | null;
  /** When an end was tapped last with nothing after it; null otherwise. */
  endTappedAt: number | null;
}

/**
 * Walks through a worker's acts as a step function (LEDGER.md 3 and 4): each says what is done from
 * its instant on. Instants are floored to whole seconds here, once.
 *
 * @param acts in order
 */
export function walk(acts: readonly Act[], way: Way): Walked {
  const looseEnds: LooseEnd[] = [];
  const state: State = {
    segments: [],
    shifts: [],
    looseEnds,
    standing: null,
    shiftOf: new Map(),
    way,
    ask: (code, subject, at) => looseEnds.push({ code, subject, at, settled: false }),
    open: null,
    leftAt: null,
    endTappedAt: null,
  };
  for (const act of acts) step(state, act, Math.floor(act.atMs / 1000));
  const { open } = state;
  const asOf = Math.floor(way.asOfMs / 1000);
  if (open && isPastDeadline(open, asOf)) closeForgotten(state, open, asOf);
  else if (open) leaveOpen(state, open);
  return state;
}

function step(state: State, act: Act, at: number): void {
  if (act.closes !== null) {
    closeByAnswer(state, act, at);
    return;
  }
  if (state.open && isPresence(act) && isForgotten(state.open, act, at))
    closeForgotten(state, state.open, at);
  if (act.body.kind === "shift-start") startTapped(state, act, at);
  else if (act.body.kind === "shift-end") endTapped(state, act, at);
  else within(state, act, at);
}

/** Past the limit a shift goes on only while taps follow each other closer than shifts do. */
function isForgotten({ start, rules, lastTap }: OpenShift, { body }: Act, at: number): boolean {
  if (at <= start + rules.shiftLimitSeconds) return false;
  const isRested = at - lastTap.at >= rules.restBetweenShiftsSeconds;
  return body.kind === "shift-start" || isRested || at > start + LONGEST_SHIFT_SECONDS;
}

/** A start inside a shift changes nothing; from a kiosk that was offline it is no question either. */
function startTapped(state: State, act: Act, at: number): void {
  const { open, looseEnds } = state;
  if (!open) {
    begin(state, act, at);
    return;
  }
  const settled = act.receivedMs === null || act.receivedMs - act.atMs > OFFLINE_MS;
  looseEnds.push({ code: "already-in", subject: act.id, at, settled });
  see(state, open, act, at);
}

function begin(state: State, act: Act, at: number): OpenShift {
  const { facts } = state.way;
  const { restBetweenShiftsSeconds } = ruleAt(facts.rules, at * 1000);
  if (state.leftAt !== null && at - state.leftAt < restBetweenShiftsSeconds)
    state.ask("rest-short", act.id, at);
  const open = openShift(act, at, facts);
  state.open = open;
  state.endTappedAt = null;
  state.shiftOf.set(act.id, act.id);
  return open;
}

/** An end without a shift was said twice if another came just before; else the start is missing. */
function endTapped(state: State, act: Act, at: number): void {
  const { open, endTappedAt } = state;
  if (open) {
    see(state, open, act, at);
    close(state, open, { end: at, endEvent: act.id, provisional: false });
    state.leftAt = at;
  } else {
    const { shiftLimitSeconds } = ruleAt(state.way.facts.rules, at * 1000);
    const isSaidTwice = endTappedAt !== null && at - endTappedAt <= shiftLimitSeconds;
    if (!isSaidTwice) state.ask("implied-start", act.id, at);
  }
  state.endTappedAt = at;
}

/** An end told afterwards ends the shift that it names, if that one is open then. */
function closeByAnswer(state: State, act: Act, at: number): void {
  const { open } = state;
  if (open?.startEvent !== act.closes || at - open.start > LONGEST_SHIFT_SECONDS) return;
  state.ask("no-shift-end", open.startEvent, at);
  close(state, open, { end: at, endEvent: act.id, provisional: false });
  state.leftAt = at;
  state.endTappedAt = at;
}

/** Ends a shift that nobody ended, no later than `before`; what came after the last tap is unknown. */
function closeForgotten(state: State, open: OpenShift, before: number): void {
  const { startEvent, lastTap } = open;
  const { settlements, facts } = state.way;
  state.ask("no-shift-end", startEvent, lastTap.at);
  if (open.break) state.ask("break-open", open.break.event, open.break.since);
  const answer = settlements.get(endKey("no-shift-end", startEvent));
  const accepted = answer?.answer === "accept" ? answer.event.id : null;
  open.break = null; // how long it was is not known either
  cutAtLastTap(open);
  close(state, open, {
    end: Math.min(plannedEnd(open, facts), before),
    endEvent: accepted,
    provisional: accepted === null,
  });
}

function close(
  state: State,
  open: OpenShift,
  closing: Pick<Shift, "provisional" | "endEvent"> & { end: number },
): void {
  const { start, startEvent, cell, rules } = open;
  askLongBreak(open, closing.end, { rules: state.way.facts.rules, ask: state.ask });
  if (closing.end - start > rules.shiftLimitSeconds) state.ask("shift-long", startEvent, start);
  state.segments.push(...segmentsOf(open, closing.end));
  if (closing.end > start) state.shifts.push({ start, startEvent, cell, ...closing });
  state.open = null;
  state.leftAt = null;
  state.endTappedAt = null;
}

function leaveOpen(state: State, open: OpenShift): void {
  const { start, startEvent, cell } = open;
  const shift = { start, startEvent, cell, end: null, endEvent: null, provisional: false };
  const { doing, since, said, event } = open.activity;
  state.segments.push(...segmentsOf(open, null));
  state.shifts.push(shift);
  state.standing = { shift, doing, since, said, event, break: open.break };
}

/** Any other act; where no shift is open it may start one, which is asked about. */
function within(state: State, act: Act, at: number): void {
  if (!state.open && !startsShift(act)) return;
  if (!state.open) state.ask("implied-start", act.id, at);
  const open = state.open ?? begin(state, act, at);
  takeEffect(open, { act, at, rules: state.way.facts.rules, ask: state.ask });
  if (isPresence(act)) see(state, open, act, at);
}

/** Notes a sign of the worker, and in which shift the act lies. */
function see(state: State, open: OpenShift, act: Act, at: number): void {
  open.lastTap = { at, event: act.id, kiosk: act.kiosk };
  state.shiftOf.set(act.id, open.startEvent);
}
