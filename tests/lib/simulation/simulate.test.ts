import { beforeAll, describe, expect, test, vi } from "vitest";
import { cast } from "@/lib/demo/cast";
import { clockEvent } from "@/lib/ledger/schema";
import type { DemoEvent } from "@/lib/simulation/record";
import { type DemoRun, simulate } from "@/lib/simulation/simulate";

const nowMs = Date.parse("2026-05-14T16:20:00Z");
const slice = { weeks: 1, people: cast.slice(0, 30), openTickets: 60 };

let run: DemoRun;
let byWorker: Map<string, DemoEvent[]>;

// A whole history is played once, and slices of one: seconds each on a slow machine.
vi.setConfig({ testTimeout: 60_000, hookTimeout: 60_000 });

beforeAll(() => {
  run = simulate({ nowMs });
  byWorker = new Map(cast.map(({ number }) => [number, []]));
  for (const each of run.events) {
    if (each.event.by === undefined) byWorker.get(each.event.worker)!.push(each);
  }
});

const at = ({ event }: DemoEvent) => Date.parse(event.at);
const counts = () =>
  run.events.flatMap(({ event }) =>
    event.kind === "report" || event.kind === "inspect" ? [event] : [],
  );

describe("simulate", () => {
  test("plays the same history for the same instant, and another for another", () => {
    const play = (ms: number) => {
      const { calendar: _, ...told } = simulate({ nowMs: ms, ...slice });
      return told;
    };
    const [once, again, later] = [play(nowMs), play(nowMs), play(nowMs + 1_000)];
    expect(again).toEqual(once);
    expect(later.events[0]).not.toEqual(once.events[0]);
  });

  test("writes only events that the ledger can read, each with an id of its own", () => {
    const unread = run.events.filter(({ event }) => !clockEvent.safeParse(event).success);
    expect(unread).toEqual([]);
    expect(new Set(run.events.map(({ event }) => event.id)).size).toBe(run.events.length);
  });

  test("nothing lies after now or before the history, and the server gets nothing early", () => {
    const startsMs = run.calendar.startsAt * 1000;
    const wrong = run.events.filter(
      (each) => at(each) < startsMs || each.receivedAtMs <= at(each) || each.receivedAtMs > nowMs,
    );
    expect(wrong).toEqual([]);
  });

  test("every week is as full as the others", () => {
    const weeks = Array.from({ length: 8 }, () => 0);
    for (const each of run.events) {
      const week = Math.floor((at(each) - run.calendar.startsAt * 1000) / (7 * 86_400_000));
      if (week < 8) weeks[week]! += 1;
    }
    expect(Math.min(...weeks)).toBeGreaterThan(Math.max(...weeks) * 0.75);
    expect(Math.min(...weeks)).toBeGreaterThan(4_000);
  });

  test("nobody is in two places: one act after the other, each in a shift", () => {
    const wrong = [...byWorker.values()].flatMap((events) => {
      let isIn = false;
      return events.filter((each, index) => {
        const isLater = index === 0 || at(each) > at(events[index - 1]!);
        if (each.event.kind === "shift-start") isIn = true;
        const isRight = isIn && isLater;
        if (each.event.kind === "shift-end") isIn = false;
        return !isRight;
      });
    });
    expect(wrong).toEqual([]);
  });

  test("every shift is ended but those that run and the few that were forgotten", () => {
    const marks = [...byWorker.values()].flatMap((events) => {
      const own = events.filter(({ event }) => /^shift-/.test(event.kind));
      return own.filter(
        ({ event }, index) =>
          event.kind === "shift-start" && own[index + 1]?.event.kind !== "shift-end",
      );
    });
    const forgotten = marks.filter((each) => at(each) < nowMs - 15 * 3_600_000);
    expect(forgotten.length).toBe(5);
    expect(marks.length - forgotten.length).toBeGreaterThan(20);
  });

  test("about 180 tickets are open, and they stand in every cell", () => {
    const open = run.tickets.filter(({ endedAt }) => endedAt === null);
    expect(open).toHaveLength(180);
    const cells = new Set(open.map((ticket) => ticket.steps[ticket.current]!.operation.cell));
    expect(cells.size).toBe(11);
  });

  test("a ticket's operations are counted in the order of its routing, none before it rested", () => {
    const tickets = new Map(run.tickets.map((ticket) => [ticket.number, ticket]));
    const last = new Map<string, number>();
    for (const { ticket, operation } of counts()) {
      const place = tickets
        .get(ticket)!
        .steps.findIndex((step) => step.operation.code === operation);
      expect(place).toBeGreaterThanOrEqual(last.get(ticket) ?? 0);
      last.set(ticket, place);
    }
  });

  test("pieces do not multiply: what is counted good is the lot less its scrap, save two slips", () => {
    const good = new Map<string, number>();
    for (const count of counts()) {
      const key = `${count.ticket} ${count.operation}`;
      good.set(key, (good.get(key) ?? 0) + count.good + count.scrap);
    }
    const wrong = run.tickets.flatMap(({ number, lot, steps, current }) =>
      steps
        .slice(0, current)
        .filter(({ operation }) => (good.get(`${number} ${operation.code}`) ?? 0) > lot),
    );
    expect(wrong.length).toBeLessThan(12);
  });

  test("two tickets at once, two people on one ticket, rework and scrap all happen", () => {
    const bodies = run.events.map(({ event }) => event);
    expect(bodies.some((body) => body.kind === "work" && body.items.length > 1)).toBe(true);
    expect(bodies.some((body) => body.kind === "work" && body.activity === "rework")).toBe(true);
    expect(counts().some(({ scrap }) => scrap > 0)).toBe(true);
    const hands = new Map<string, Set<string>>();
    for (const { ticket, operation, worker } of counts()) {
      const key = `${ticket} ${operation}`;
      hands.set(key, (hands.get(key) ?? new Set()).add(worker));
    }
    expect([...hands.values()].some(({ size }) => size > 1)).toBe(true);
  });

  test.each([
    ["a weekday morning", "2026-05-13T14:00:00Z"],
    ["a weekday night", "2026-05-13T09:00:00Z"],
    ["the change of shifts", "2026-05-13T19:50:00Z"],
    ["a Saturday afternoon", "2026-05-16T21:00:00Z"],
    ["a Sunday before dawn", "2026-05-17T08:30:00Z"],
    ["the night on which the clocks go back", "2026-11-01T06:45:00Z"],
  ])("on %s somebody is in and at work", (_, instant) => {
    const { events } = simulate({ nowMs: Date.parse(instant), weeks: 1, openTickets: 60 });
    const doing = new Map<string, string>();
    for (const { event } of events) doing.set(event.worker, event.kind);
    const isIn = [...doing.values()].filter((kind) => kind !== "shift-end");
    expect(isIn.length).toBeGreaterThanOrEqual(2);
    expect(isIn.some((kind) => /^(work|break-end)$/.test(kind))).toBe(true);
  });
});
