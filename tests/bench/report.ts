import { CONNECTIONS, type PacedRun, type Run } from "@/tests/bench/drive";
import { BATCH } from "@/tests/bench/shots";

/** What was measured, all in one go on one machine. */
export interface Measured {
  empty: Run;
  single: Run;
  /** One event a request, as many a second as the budget says. */
  steady: PacedRun;
  batched: Run;
  signedIn: Run;
  replayed: Run;
}

/** Sets the runs side by side and, since machines differ, in proportion to each other. */
export function reportOf(measured: Measured): string {
  const { empty, single, steady, batched, signedIn, replayed } = measured;
  const events = batched.perSecond * BATCH;
  return [
    `${CONNECTIONS} at a time, fsync on, all on this machine; ms: half of the calls, 99 of 100`,
    line("the same route, for nobody", empty, `${empty.perSecond.toFixed(0)} requests/s`),
    line("POST /api/kiosk/events, 1 event", single, `${single.perSecond.toFixed(0)} events/s`),
    line("the same at a steady pace", steady, `${steady.perSecond.toFixed(0)} events/s`),
    line(`POST /api/kiosk/events, ${BATCH} events`, batched, `${events.toFixed(0)} events/s`),
    line("pgbench, the same statements", replayed, `${replayed.perSecond.toFixed(0)} events/s`),
    line("sign-in with PIN", signedIn, `${signedIn.perSecond.toFixed(1)} sign-ins/s`),
    "",
    `a tap, at a steady pace: 97.5 of 100 within ${steady.p975.toFixed(0)} ms   (budget: 95 in 150)`,
    ratio("one event a request, to the route for nobody", single.perSecond / empty.perSecond, 0.5),
    ratio("batches, to pgbench", events / replayed.perSecond, 2),
    ratio("one event a request, to pgbench", single.perSecond / replayed.perSecond),
    "",
  ].join("\n");
}

function line(name: string, { p50, p99 }: Run, rate: string): string {
  const ms = `${p50.toFixed(0).padStart(6)} ${p99.toFixed(0).padStart(6)} ms`;
  return `${name.padEnd(36)} ${rate.padStart(18)}   ${ms}`;
}

function ratio(name: string, value: number, wanted?: number): string {
  const budget = wanted === undefined ? "" : `   (budget: ${wanted.toFixed(1)} or more)`;
  return `${name.padEnd(46)} ${value.toFixed(2).padStart(6)}${budget}`;
}
