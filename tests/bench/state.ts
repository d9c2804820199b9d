import { v7 as uuid } from "uuid";
import { hashPassword } from "@/app/_server/password";
import { hashSecret, newSecret } from "@/app/_server/secret";
import type { Db } from "@/db/client";
import { kioskCells, kioskSessions, kiosks } from "@/db/kiosks/tables";
import { bookEvents } from "@/db/ledger/commands";
import { workers } from "@/db/people/tables";
import { ticketNumberOf } from "@/lib/codes/ticket-code";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import { type Factory, makeFactory, makeTicket } from "@/tests/make/factory";

/** A site of 4,000 people at 80 tablets, of whom each has been at work since the morning. */
const KIOSKS = 80;
const WORKERS_A_KIOSK = 50;
/** Three tickets for four people: now and then two are on the same one. */
const TICKETS = 3000;
/** Every worker's. One Argon2id hash serves all: making it is not what is measured. */
export const PIN = "271828";
const HOUR = 3_600_000;

export interface BenchWorker {
  number: string;
  session: string;
  kioskId: string;
  cookie: string;
}

/** The factory in the middle of a morning, with what is needed to go on from there. */
export interface State {
  siteId: string;
  workers: BenchWorker[];
  tickets: string[];
}

let seq = 0;

/** An event as a tablet makes it. */
export function tapped(worker: BenchWorker, atMs: number, body: EventBody): ClockEvent {
  seq += 1;
  const clock = { offsetMs: 0, uncertaintyMs: 20, boot: "bench", monotonicMs: seq, seq };
  const { session, number } = worker;
  const at = new Date(atMs).toISOString();
  return { id: uuid(), v: 1, session, worker: number, at, clock, ...body } as ClockEvent;
}

/** Work on the factory's first operation of the worker's nth ticket. */
export function workOn({ tickets }: State, worker: BenchWorker, nth: number): EventBody {
  const ticket = tickets[(Number(worker.number) * 7 + nth) % tickets.length]!;
  return { kind: "work", activity: "run", items: [{ ticket, operation: "010" }] };
}

/** Makes the factory and books its morning: six events for everyone. */
export async function makeState(db: Db): Promise<State> {
  const factory = await makeFactory(db);
  const tickets: string[] = [];
  for (let running = 1; running <= TICKETS; running += 1) {
    const number = ticketNumberOf(26, 10_000 + running);
    await makeTicket(factory, { number, quantity: 40 });
    tickets.push(number);
  }
  const people = await makePeople(factory);
  const state = { siteId: factory.siteId, workers: people, tickets };
  for (const group of byKiosk(people)) await bookMorning(db, state, group);
  return state;
}

async function makePeople(factory: Factory): Promise<BenchWorker[]> {
  const { db, siteId, cellIds } = factory;
  const pinHash = await hashPassword(PIN);
  const people: BenchWorker[] = [];
  const openedAt = new Date(Date.now() - 4 * HOUR);
  for (let tablet = 0; tablet < KIOSKS; tablet += 1) {
    const [kioskId, token] = [uuid(), newSecret()];
    const effectiveFrom = new Date("2026-01-01T00:00:00Z");
    const name = `Tablet ${tablet}`;
    await db.insert(kiosks).values({ siteId, id: kioskId, name, tokenHash: hashSecret(token) });
    const cell = { siteId, id: uuid(), kioskId, cellId: cellIds.Mill, effectiveFrom };
    await db.insert(kioskCells).values(cell);
    const made = Array.from({ length: WORKERS_A_KIOSK }, (_, at) => ({
      id: uuid(),
      number: String(2000 + tablet * WORKERS_A_KIOSK + at),
      session: uuid(),
    }));
    await db.insert(workers).values(
      made.map(({ id, number }) => ({
        siteId,
        id,
        number,
        name: `Worker ${number}`,
        homeCellId: cellIds.Mill,
        pinHash,
      })),
    );
    await db
      .insert(kioskSessions)
      .values(
        made.map(({ id, session }) => ({ siteId, id: session, kioskId, workerId: id, openedAt })),
      );
    const cookie = `bookmatch_kiosk=${token}`;
    people.push(...made.map(({ number, session }) => ({ number, session, kioskId, cookie })));
  }
  return people;
}

async function bookMorning(db: Db, state: State, group: readonly BenchWorker[]): Promise<void> {
  const start = Date.now() - 3 * HOUR;
  const events = group.flatMap((worker, at) => {
    const on = workOn(state, worker, 0);
    const [item] = (on as { items: { ticket: string; operation: string }[] }).items;
    const done = { kind: "report", ...item!, good: 1, rework: 0, scrap: 0, stop: false } as const;
    const acts: EventBody[] = [
      { kind: "shift-start" },
      on,
      { kind: "break-start", break: "rest" },
      { kind: "break-end", break: "rest" },
      done,
      workOn(state, worker, 1),
    ];
    return acts.map((act, nth) => tapped(worker, start + nth * 600_000 + at * 1000, act));
  });
  const { kioskId } = group[0]!;
  const scope = { db, siteId: state.siteId };
  const booked = await bookEvents(scope, { kioskId, events, receivedAt: new Date() });
  if (!booked.ok) throw new Error(booked.problem.detail);
  const odd = booked.value.results.find(
    ({ verdict, looseEnds }) => verdict !== "booked" || looseEnds.length,
  );
  if (odd) throw new Error(`the morning is odd: ${JSON.stringify(odd)}`);
}

/** Groups people by the tablet that they work at. */
export function byKiosk(people: readonly BenchWorker[]): BenchWorker[][] {
  const groups = new Map<string, BenchWorker[]>();
  for (const worker of people) {
    const group = groups.get(worker.kioskId) ?? [];
    groups.set(worker.kioskId, [...group, worker]);
  }
  return [...groups.values()];
}
