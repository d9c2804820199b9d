import { v7 as uuid } from "uuid";
import type { Shot } from "@/tests/bench/drive";
import { type BenchWorker, byKiosk, PIN, type State, tapped, workOn } from "@/tests/bench/state";

/** Events in a batch, as a tablet hands in what it kept. */
export const BATCH = 100;

/** The next tap of a worker: on to another ticket, now. */
export function nextTap(state: State, worker: BenchWorker) {
  return tapped(worker, Date.now(), workOn(state, worker, 2));
}

/** To the same route handler by nobody: it looks at a header and answers; the rest is the framework. */
export function empties(count: number): Shot[] {
  return Array.from({ length: count }, () => ({ path: "/api/kiosk/events", body: "{}" }));
}

/** One event of each of these people, each in a request of its own. */
export function singles(state: State, people: readonly BenchWorker[]): Shot[] {
  return people.map((worker) => handIn(worker, [nextTap(state, worker)]));
}

/** Batches of two taps, a minute apart, of each of the fifty people of a tablet. */
export function batches(state: State, people: readonly BenchWorker[], count: number): Shot[] {
  const groups = byKiosk(people).filter((group) => group.length * 2 >= BATCH);
  return Array.from({ length: count }, (_, nth) => {
    const group = groups[nth % groups.length]!;
    const round = Math.floor(nth / groups.length);
    const atMs = Date.now() - (10 - round * 2) * 60_000;
    const taps = group.flatMap((worker) => [
      tapped(worker, atMs, workOn(state, worker, 2 + round * 2)),
      tapped(worker, atMs + 60_000, workOn(state, worker, 3 + round * 2)),
    ]);
    return handIn(group[0]!, taps.slice(0, BATCH));
  });
}

/** A sign-in of each of these people, on their own tablet. */
export function signIns(people: readonly BenchWorker[]): Shot[] {
  return people.map(({ number, cookie }) => ({
    path: "/api/kiosk/sign-in",
    cookie,
    body: JSON.stringify({ session: uuid(), worker: number, pin: PIN }),
  }));
}

function handIn(worker: BenchWorker, events: readonly unknown[]): Shot {
  const body = JSON.stringify({ events, deviceTime: new Date().toISOString() });
  return { path: "/api/kiosk/events", cookie: worker.cookie, body };
}
