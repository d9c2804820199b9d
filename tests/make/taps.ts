import { v7 as uuid } from "uuid";

/** A tap of a fortnight: local instant, and what was tapped. */
export interface FortnightTap {
  atMs: number;
  body: { kind: string } & Record<string, unknown>;
}

/** One day of somebody's taps, in local minutes after midnight; `end` null where it is forgotten. */
export interface TappedDay {
  startMs: number;
  start: number;
  meal: readonly [start: number, end: number];
  end: number | null;
}

/** The taps of a day: in, a meal, other work after it, out. */
export function tapsOf({ startMs, start, meal, end }: TappedDay): FortnightTap[] {
  const at = (minute: number) => startMs + minute * 60_000;
  return [
    { atMs: at(start), body: { kind: "shift-start" } },
    { atMs: at(start + 1), body: { kind: "indirect", code: "cleaning" } },
    { atMs: at(meal[0]), body: { kind: "break-start", break: "meal" } },
    { atMs: at(meal[1]), body: { kind: "break-end", break: "meal" } },
    ...(end === null ? [] : [{ atMs: at(end), body: { kind: "shift-end" } }]),
  ];
}

/** Taps as a tablet hands them in, in order, with its clock measured. */
export function tappedEvents(
  taps: readonly FortnightTap[],
  { session, worker }: { session: string; worker: string },
) {
  return taps.map(({ atMs, body }, seq) => ({
    id: uuid(),
    v: 1,
    session,
    worker,
    at: new Date(atMs).toISOString(),
    clock: { offsetMs: 0, uncertaintyMs: 50, boot: "one", monotonicMs: seq * 1000, seq },
    ...body,
  }));
}
