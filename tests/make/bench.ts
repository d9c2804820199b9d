import { firstState } from "@/lib/bench/first-state";
import type { BenchSession, Device, KioskState } from "@/lib/bench/schema";
import { benchView } from "@/lib/bench/view";
import { checkDigit } from "@/lib/codes/damm";
import type { Bench, KioskCell, KioskTicket, TicketOperation } from "@/lib/kiosks/schema";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import type { Effect, Input } from "@/lib/taps/inputs";
import { step } from "@/lib/taps/step";

/** 14 May 2026, 06:52 in Chicago: shortly before the early shift. */
const MORNING_MS = Date.UTC(2026, 4, 14, 11, 52);
export const NIA = "1042";

const id = (n: number) => `018f7000-0000-7000-8000-${String(n).padStart(12, "0")}`;
const site = { id: id(1), name: "Larkmoor Stringworks", timeZone: "America/Chicago", locale: "en" };

/** A ticket number with its check digit. */
export function numbered(sevenDigits: string): string {
  return sevenDigits + checkDigit(sevenDigits);
}

export const HERON = numbered("2604817");
export const WREN = numbered("2604902");
export const AVOCET = numbered("2605003");
export const PLOVER = numbered("2605006");

/** A ticket operation of the neck cell, ready to run: 5 min setup, earned, and 10 min a piece. */
export function operationOf(change: Partial<TicketOperation> = {}): TicketOperation {
  return {
    operation: "120",
    name: "Fret press and level",
    stage: "neck",
    cell: "Neck",
    state: "ready",
    setupSeconds: 300,
    runSeconds: 600,
    setupEarned: true,
    quantity: 4,
    openQuantity: 4,
    good: 0,
    rework: 0,
    scrap: 0,
    actualSeconds: 0,
    workers: [],
    here: true,
    obstacles: [],
    hazards: [],
    holds: [],
    qualification: null,
    ...change,
  };
}

/** A ticket with the operations given. */
export function ticketOf(ticket: string, operations: TicketOperation[]): KioskTicket {
  return {
    ticket,
    model: "Heron",
    options: ["natural satin"],
    quantity: 4,
    status: "open",
    dueOn: null,
    operations,
  };
}

const milled = operationOf({
  operation: "110",
  name: "Neck blank mill",
  cell: "Mill",
  here: false,
  state: "finished",
  obstacles: ["finished"],
});
const sprayed = operationOf({
  operation: "140",
  name: "Spray clear coat",
  cell: "Spray",
  here: false,
  obstacles: ["wrong-cell"],
});
const single = { quantity: 1, openQuantity: 1 };

/** The tickets that the neck cell's kiosk knows. */
export const tickets: KioskTicket[] = [
  ticketOf(HERON, [milled, operationOf(), sprayed]),
  ticketOf(WREN, [operationOf({ ...single, setupEarned: false })]),
  ticketOf(AVOCET, [operationOf({ ...single, hazards: ["spray"] })]),
  ticketOf(PLOVER, [sprayed]),
];

export const cell: KioskCell = {
  kiosk: { deviceId: id(2), name: "Neck cell, bench 14" },
  site,
  cells: ["Neck"],
  rules: {
    timeZone: site.timeZone,
    productionDayStartsAtMinutes: 0,
    shiftLimitSeconds: 14 * 3600,
    sinceLimitSeconds: 1800,
    restMaxSeconds: 1200,
    mealMaxSeconds: 4500,
    restBetweenShiftsSeconds: 39_600,
  },
  people: [
    {
      worker: NIA,
      name: "Nia Vale",
      language: "en",
      homeHere: true,
      inSince: null,
      qualifications: [],
    },
  ],
  tickets,
  queue: tickets.slice(0, 3).map(({ ticket }) => ({ ticket, operation: "120" })),
  otherWork: ["cleaning", "waiting-lead"],
  notes: [],
};

export const device: Device = {
  deviceId: id(2),
  name: "Neck cell, bench 14",
  cell: "Neck",
  site,
  sealKey: { kid: "k1", key: "" },
  muted: false,
};

/** A bench on which nothing has happened yet; the early shift is planned from 07:00 to 15:30. */
export function benchOf(change: Partial<Bench> = {}): Bench {
  return {
    shift: null,
    work: null,
    other: null,
    break: null,
    breakSince: null,
    today: {
      attendanceSeconds: 0,
      directSeconds: 0,
      indirectSeconds: 0,
      restSeconds: 0,
      mealSeconds: 0,
      unassignedSeconds: 0,
    },
    changes: [],
    looseEnds: [],
    events: [],
    planned: { start: "2026-05-14T12:00:00Z", end: "2026-05-14T20:30:00Z" },
    next: [],
    ...change,
  };
}

/** A session that a PIN opened. */
export function sessionOf(change: Partial<BenchSession> = {}): BenchSession {
  return {
    session: id(900),
    worker: NIA,
    name: "Nia Vale",
    language: "en",
    role: "worker",
    openedMs: MORNING_MS,
    endedMs: null,
    token: "token",
    sealed: null,
    ...change,
  };
}

/**
 * A kiosk without a world: inputs go into the reducer, records are kept at once unless `slowDisk`
 * is set, tickets are found among those it knows, and effects are listed.
 */
export class TestKiosk {
  state: KioskState = firstState;
  nowMs = MORNING_MS;
  slowDisk = false;
  readonly effects: Effect[] = [];
  private made = 0;

  /** An enrolled kiosk at the door. */
  static atDoor(): TestKiosk {
    const kiosk = new TestKiosk();
    kiosk.send({
      on: "started",
      known: { device, cell, sessions: [], benches: {}, pending: [] },
    });
    return kiosk;
  }

  /** Nia is in since 06:52 and stands before her bench. */
  static atBench(): TestKiosk {
    const kiosk = TestKiosk.atDoor().signIn();
    kiosk.send({ on: "start-shift" }, { on: "stay" });
    return kiosk;
  }

  /** Nia has worked on the Heron's lot of four for a minute. */
  static atWork(): TestKiosk {
    return TestKiosk.atBench().take(HERON).send({ on: "stay" }).touch(60);
  }

  send(...inputs: Input[]): this {
    for (const input of inputs) {
      const [next, effects] = step(this.state, input, this.nowMs, benchView);
      this.state = next;
      this.effects.push(...effects);
      for (const effect of effects) this.answer(effect);
    }
    return this;
  }

  /** Lets time pass; the kiosk ticks at its end. */
  pass(seconds: number): this {
    this.nowMs += seconds * 1000;
    return this.send({ on: "tick" });
  }

  /** Lets time pass in which the screen was touched all along. */
  touch(seconds: number): this {
    this.nowMs += seconds * 1000;
    return this.send({ on: "touch" });
  }

  key(digits: string): this {
    for (const digit of digits) this.send({ on: "digit", digit });
    return this;
  }

  signIn(): this {
    this.key(NIA).send({ on: "submit" }).key("271828");
    return this.send({ on: "signed-in", session: sessionOf(), bench: benchOf() });
  }

  /** Scans a ticket and takes the first thing that it offers here. */
  take(ticket: string, add = false, activity: "run" | "setup" = "run"): this {
    this.send({ on: "scan-for", add }, { on: "scan", text: `T${ticket}` });
    return this.send({ on: "take", choice: { ticket, operation: "120", activity } });
  }

  /** The records kept so far, by kind. */
  get kinds(): string[] {
    return this.state.pending.map(({ kind }) => kind);
  }

  get last(): ClockEvent | undefined {
    return this.state.pending.at(-1);
  }

  get view() {
    return benchView(this.state, NIA);
  }

  /** The disk has taken what is being saved. */
  keep(): this {
    const effect = this.effects.findLast((each) => each.do === "record");
    if (effect?.do !== "record") return this;
    const events = effect.bodies.map((body) => this.eventOf(body, effect));
    return this.send({ on: "recorded", events });
  }

  private answer(effect: Effect): void {
    if (effect.do === "record" && !this.slowDisk) this.keep();
    if (effect.do !== "find-ticket") return;
    const { code } = effect;
    const ticket = tickets.find((each) => each.ticket === code);
    this.send(ticket ? { on: "ticket", code, ticket } : { on: "no-ticket", code, away: false });
  }

  private eventOf(
    body: EventBody,
    who: { worker: string; session: string; note?: string },
  ): ClockEvent {
    this.made += 1;
    const clock = { offsetMs: 0, uncertaintyMs: 5, boot: "b", monotonicMs: 0, seq: this.made };
    const at = new Date(this.nowMs).toISOString();
    const { note, worker, session } = who;
    const said = note === undefined ? {} : { note };
    // safe because the spread of a body keeps its kind and fields together
    return {
      id: id(100 + this.made),
      v: 1,
      worker,
      session,
      at,
      clock,
      ...said,
      ...body,
    } as ClockEvent;
  }
}
