import { v7 as uuid } from "uuid";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";

/** A source of chance that a seed makes the same every time (mulberry32). */
export function chance(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return Math.floor((((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296) * below);
  };
}

interface Stream {
  draw: (below: number) => number;
  /** Whose events, and the lead who corrects them. */
  worker: string;
  session: string;
  lead: { number: string; session: string };
  startMs: number;
  count: number;
}

/**
 * A worker's events as no sane day has them: kinds, gaps and corrections by chance over some days,
 * with weights of the kiosk's own, so that nothing depends on when they are booked.
 */
export function randomEvents({
  draw,
  worker,
  session,
  lead,
  startMs,
  count,
}: Stream): ClockEvent[] {
  const events: ClockEvent[] = [];
  let atMs = startMs;
  const pick = <T>(list: readonly T[]): T => list[draw(list.length)]!;
  const items = () =>
    Array.from({ length: 1 + draw(3) }, (_, place) => ({
      ticket: `2600000${draw(3)}`,
      operation: `0${place + 1}0`,
      weight: 1 + draw(5),
    }));
  const target = () => (events.length ? pick(events.slice(-6)).id : uuid());
  const bodies: (() => EventBody)[] = [
    () => ({ kind: "shift-start" }),
    () => ({ kind: "shift-end" }),
    () => ({ kind: "work", activity: pick(["setup", "run", "rework", "inspect"]), items: items() }),
    () => ({ kind: "work", activity: "run", items: items() }),
    () => ({ kind: "work", activity: "run", items: items(), since: iso(atMs - draw(2400) * 1000) }),
    () => ({ kind: "indirect", code: "cleaning" }),
    () => ({ kind: "break-start", break: pick(["meal", "rest"]) }),
    () => ({ kind: "break-end", break: "rest" }),
    () => ({ kind: "pause", items: items() }),
    () => ({
      kind: "report",
      ...name(items()[0]!),
      good: 1,
      rework: 0,
      scrap: 0,
      stop: draw(2) === 0,
    }),
    () => ({ kind: "undo", event: target() }),
    () => ({ kind: "reassign", event: target(), activity: "run", items: items() }),
    () => ({ kind: "object", subject: target() }),
  ];
  const corrections: (() => EventBody)[] = [
    () => ({ kind: "void", event: target() }),
    () => ({ kind: "move", event: target(), to: iso(atMs - draw(40) * 3_600_000) }),
    () => ({
      kind: "settle",
      end: `no-shift-end:${target()}`,
      answer: pick(["accept", `end-at:${iso(atMs - draw(20) * 3_600_000)}`]),
    }),
    () => {
      const at = iso(atMs - draw(50) * 3_600_000);
      const event = { ...head(at), kind: "indirect", code: "meeting" };
      return { kind: "insert", event };
    },
  ];
  const head = (at: string) => {
    const seq = events.length + 1;
    const clock = { offsetMs: 0, uncertaintyMs: 10, boot: "b", monotonicMs: seq, seq };
    return { id: uuid(), v: 1 as const, session, worker, at, clock };
  };
  while (events.length < count) {
    // mostly minutes; sometimes seconds, sometimes a night or a lost day
    atMs += [4000, 9000, 1000 * draw(7200), 60_000 * draw(240), 3_600_000 * draw(30)][draw(5)]!;
    const isByLead = draw(8) === 0;
    const body = pick(isByLead ? corrections : bodies)();
    const by = isByLead ? { by: lead.number, session: lead.session } : {};
    events.push({ ...head(iso(atMs)), ...body, ...by } as ClockEvent);
  }
  return events;
}

const iso = (ms: number) => new Date(ms).toISOString();

const name = ({ ticket, operation }: { ticket: string; operation: string }) => ({
  ticket,
  operation,
});
