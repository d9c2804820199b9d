import type { CellName } from "@/lib/demo/cells";
import { type Random, randomFrom, uuidAt } from "@/lib/demo/random";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";

/** One PIN entry at a cell's kiosk; every event names its session. */
export interface DemoSession {
  id: string;
  cell: CellName;
  worker: string;
  openedAtMs: number;
  /** When the worker's shift ended; null while it runs or where nobody ended it. */
  endedAtMs: number | null;
}

/** An event as it left the kiosk of a cell, and when the server got it. */
export interface DemoEvent {
  cell: CellName;
  receivedAtMs: number;
  event: ClockEvent;
}

/** A tap as someone made it; the kiosk's own figures are added at the end. */
interface Tap {
  id: string;
  atMs: number;
  cell: CellName;
  worker: string;
  session: DemoSession;
  body: EventBody;
  /** The lead who entered it for the worker. */
  by?: string;
}

/** The taps of a run, kept in the order in which they were made. */
export interface Record {
  /** Notes a tap at an epoch second and answers its event id. */
  tap(tap: {
    at: number;
    cell: CellName;
    worker: string;
    /** The lead who enters it for the worker, in a session of the own. */
    by?: string;
    shift: number;
    body: EventBody;
  }): string;
  /** Everything that reached the server by `untilMs`, in the order of the taps. */
  until(untilMs: number): { events: DemoEvent[]; sessions: DemoSession[] };
}

/** A kiosk that was cut off for a while hands in everything when it is back. */
export interface CutOff {
  cell: CellName;
  fromMs: number;
  toMs: number;
}

/** Opens the record of a run. `shift` of a tap tells the sessions of two shifts apart. */
export function recordOf(random: Random, cutOffs: readonly CutOff[]): Record {
  const taps: Tap[] = [];
  const sessions = new Map<string, DemoSession>();
  return {
    tap({ at, cell, worker, by, shift, body }) {
      const atMs = at * 1000 + random.whole(0, 999);
      const session = sessionOf(sessions, { cell, worker: by ?? worker, shift, atMs }, random);
      const id = uuidAt(atMs, random);
      taps.push({ id, atMs, cell, worker, session, body, ...(by && { by }) });
      return id;
    },
    until(untilMs) {
      const events = handIn(taps, cutOffs).filter(({ receivedAtMs }) => receivedAtMs <= untilMs);
      return { events, sessions: sessionsOf(events, sessions) };
    },
  };
}

function sessionOf(
  sessions: Map<string, DemoSession>,
  of: { cell: CellName; worker: string; shift: number; atMs: number },
  random: Random,
): DemoSession {
  const key = `${of.worker} ${of.cell} ${of.shift}`;
  const known = sessions.get(key);
  if (known) return known;
  const { cell, worker, atMs } = of;
  const openedAtMs = atMs - random.whole(2_000, 6_000);
  const opened = { id: uuidAt(openedAtMs, random), cell, worker, openedAtMs, endedAtMs: null };
  sessions.set(key, opened);
  return opened;
}

/** Gives each tap its kiosk's clock and count, and the moment at which the server had it. */
function handIn(taps: readonly Tap[], cutOffs: readonly CutOff[]): DemoEvent[] {
  const clocks = new Map<CellName, ReturnType<typeof clockOf>>();
  return [...taps]
    .sort((a, b) => a.atMs - b.atMs)
    .map(({ id, atMs, cell, worker, session, body, by }) => {
      const clock = clocks.get(cell) ?? clockOf(cell);
      clocks.set(cell, clock);
      const { reading, delayMs } = clock(atMs);
      const away = cutOffs.find((each) => each.cell === cell && isWithin(each, atMs));
      return {
        cell,
        receivedAtMs: (away ? away.toMs : atMs) + delayMs,
        event: {
          id,
          v: 1,
          session: session.id,
          worker,
          at: new Date(atMs).toISOString(),
          clock: reading,
          ...(by && { by }),
          ...body,
        },
      };
    });
}

function isWithin({ fromMs, toMs }: CutOff, atMs: number): boolean {
  return fromMs <= atMs && atMs < toMs;
}

const WEEK_MS = 7 * 86_400_000;

/** A tablet's clock: a second or so off, drifting a little, started again once a week. */
function clockOf(cell: CellName) {
  const random = randomFrom(`kiosk ${cell}`);
  const offsetMs = random.whole(-1_500, 1_500);
  let seq = 0;
  return (atMs: number) => {
    seq += 1;
    const week = Math.floor(atMs / WEEK_MS);
    const reading = {
      offsetMs: offsetMs + random.whole(-15, 15),
      uncertaintyMs: random.whole(12, 90),
      boot: `${cell.toLowerCase().replace(/\W/g, "-")}-${week}`,
      monotonicMs: atMs - week * WEEK_MS,
      seq,
    };
    return { reading, delayMs: random.whole(150, 1_800) };
  };
}

function sessionsOf(
  events: readonly DemoEvent[],
  sessions: ReadonlyMap<string, DemoSession>,
): DemoSession[] {
  const used = new Set(events.map(({ event }) => event.session));
  const ends = new Map(
    events
      .filter(({ event }) => event.kind === "shift-end")
      .map(({ event }) => [event.session, Date.parse(event.at)]),
  );
  return [...sessions.values()]
    .filter(({ id }) => used.has(id))
    .map((session) => ({ ...session, endedAtMs: ends.get(session.id) ?? null }));
}
