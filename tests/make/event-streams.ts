import fc from "fast-check";
import type { EventBody } from "@/lib/ledger/schema";
import type { LedgerEvent } from "@/lib/timeline/schema";
import { eventId, makeEvent } from "./events";

const ticket = fc.constantFrom("90001", "90002", "90003");
const operation = fc.constantFrom("120", "130");
const item = fc.record({ ticket, operation });
const items = fc.array(item, { minLength: 1, maxLength: 3 });
const small = fc.nat(3);
const pause = fc.constantFrom<"meal" | "rest">("meal", "rest");
const activity = fc.constantFrom<"setup" | "run" | "rework" | "inspect">(
  "setup",
  "run",
  "rework",
  "inspect",
);

/** What the making of a stream must know of the events around one. */
interface Place {
  number: number;
  atMs: number;
  /** An event made before. */
  target: string;
  /** An instant near to the target's. */
  nearMs: number;
}

type MakeBody = (place: Place) => EventBody;

const instant = (ms: number) => new Date(ms).toISOString();
const counts = fc.tuple(item, small, small, small);
const acts: fc.Arbitrary<MakeBody>[] = [
  fc.constant(() => ({ kind: "shift-start" })),
  fc.constant(() => ({ kind: "shift-end" })),
  pause.map((one) => () => ({ kind: "break-start", break: one })),
  pause.map((one) => () => ({ kind: "break-end", break: one })),
  fc.tuple(activity, items).map(([how, list]) => () => ({
    kind: "work",
    activity: how,
    items: list,
  })),
  fc.tuple(items, fc.nat(4000)).map(([list, ago]) => ({ atMs }: Place) => ({
    kind: "work",
    activity: "run",
    items: list,
    since: instant(atMs - ago * 1000),
  })),
  fc.constant(() => ({ kind: "indirect", code: "meeting" })),
  items.map((list) => () => ({ kind: "pause", items: list })),
  fc.tuple(counts, fc.boolean()).map(([[one, good, rework, scrap], stop]) => () => ({
    kind: "report",
    ...one,
    good,
    rework,
    scrap,
    stop,
  })),
  counts.map(([one, good, rework, scrap]) => () => ({
    kind: "inspect",
    ...one,
    good,
    rework,
    scrap,
  })),
  item.map((one) => () => ({ kind: "hand-over", ...one, to: "1043" })),
  item.map((one) => () => ({ kind: "step-done", ...one, step: "glue" })),
  fc.constant(() => ({ kind: "caution-read", operation: "120", version: "1" })),
  fc.constant(() => ({ kind: "object", subject: "count" })),
];
const corrections: fc.Arbitrary<MakeBody>[] = [
  fc.constant(({ target }) => ({ kind: "undo", event: target })),
  fc.constant(({ target }) => ({ kind: "void", event: target })),
  fc.constant(({ target, nearMs }) => ({ kind: "move", event: target, to: instant(nearMs) })),
  items.map((list) => ({ target }: Place) => ({ kind: "reassign", event: target, items: list })),
  fc.constant(({ target }) => ({ kind: "reassign", event: target, code: "training" })),
  fc.constant(({ nearMs }) => ({
    kind: "insert",
    event: { kind: "shift-end", at: instant(nearMs) },
  })),
  fc.constant(({ target, nearMs }) => ({
    kind: "settle",
    end: `no-shift-end:${target}`,
    answer: `end-at:${instant(nearMs)}`,
  })),
  fc.constantFrom("accept", "leave").map((answer) => ({ target }: Place) => ({
    kind: "settle",
    end: `no-shift-end:${target}`,
    answer,
  })),
];

/** How the events of a stream lie in time. */
interface Spread {
  startMs: number;
  /** The longest time between two events, in seconds. */
  gapSeconds: number;
  firstNumber: number;
}

const step = fc.record({
  // mostly acts, so that there is something to correct
  make: fc.oneof(
    { weight: 4, arbitrary: fc.oneof(...acts) },
    { weight: 1, arbitrary: fc.oneof(...corrections) },
  ),
  share: fc.double({ min: 0, max: 1, noNaN: true }),
  hurry: fc.boolean(),
  back: fc.nat(5),
  near: fc.integer({ min: -1_800_000, max: 1_800_000 }),
  kiosk: fc.constantFrom("east", "west", null),
  weights: fc.array(fc.nat(900), { minLength: 3, maxLength: 3 }),
  isLead: fc.integer({ min: 0, max: 9 }).map((n) => n === 0),
});

/** Streams of one worker's events of all kinds, sensible ones and others, in order of time. */
export function eventStream(
  { startMs, gapSeconds, firstNumber }: Spread,
  maxLength = 25,
): fc.Arbitrary<LedgerEvent[]> {
  return fc.array(step, { minLength: 1, maxLength, size: "max" }).map((steps) => {
    const events: LedgerEvent[] = [];
    let atMs = startMs;
    steps.forEach(({ make, share, hurry, back, near, kiosk, weights, isLead }, index) => {
      atMs += Math.floor(share * (hurry ? 9000 : gapSeconds * 1000));
      const about = events[Math.max(0, events.length - 1 - back)];
      const place: Place = {
        number: firstNumber + index,
        atMs,
        target: about?.id ?? eventId(firstNumber),
        nearMs: Math.max(startMs, Math.min(atMs, (about?.atMs ?? atMs) + near)),
      };
      const body = make(place);
      const size = "items" in body ? (body.items?.length ?? 0) : 0;
      const other = {
        kiosk,
        cell: kiosk,
        by: isLead ? "7" : null,
        weights: weights.slice(0, size),
      };
      events.push(makeEvent(place.number, atMs, body, other));
    });
    return events;
  });
}
