import { makeClock } from "@/kiosk/clock";
import { carryOut } from "@/kiosk/effects";
import { keepSettled, readKnown } from "@/kiosk/known";
import { openOutbox } from "@/kiosk/outbox";
import { type PulseClocks, refreshCell, takePulse } from "@/kiosk/pulse";
import { startSender } from "@/kiosk/sender";
import { ask } from "@/kiosk/server";
import { sealedSessions } from "@/kiosk/sessions";
import { openStore } from "@/kiosk/store";
import type { World } from "@/kiosk/world";
import { firstState } from "@/lib/bench/first-state";
import type { KioskState } from "@/lib/bench/schema";
import { stayOf } from "@/lib/bench/time-out";
import { benchView } from "@/lib/bench/view";
import { eventResults } from "@/lib/kiosks/schema";
import type { Input } from "@/lib/taps/inputs";
import { step } from "@/lib/taps/step";

/** The seams of a running kiosk: the browser's own, or a test's. */
export interface MachineParts {
  fetcher: typeof fetch;
  clocks: PulseClocks;
  newId(): string;
  random(): number;
  /** Loads the page anew: a newer build runs on the server, or a newer page took the storage. */
  reload(): void;
  storeName?: string;
}

/** A running kiosk as the screens see it. */
export interface Machine {
  state(): KioskState;
  send(input: Input): void;
  subscribe(listener: () => void): () => void;
  /** The network says that it is back, or the screen was switched on again. */
  wake(): void;
  stop(): void;
}

const PULSE_MS = 30_000;
const PULSE_AWAY_MS = 5000;
const SECOND_MS = 1000;
/** The clock is measured three times at once, so that one slow answer does not stand for long. */
const FIRST_BEATS = 3;

/**
 * Runs a kiosk: opens what it kept, hands in what waits, measures the clock, keeps its cell fresh,
 * and feeds every tap, answer and second to the reducer. All decisions are the reducer's.
 */
export async function runKiosk(parts: MachineParts): Promise<Machine> {
  const store = await openStore(parts.reload, parts.storeName);
  const outbox = openOutbox(store);
  const clock = makeClock(parts.clocks, parts.newId());
  const listeners = new Set<() => void>();
  let state = firstState;
  let isStopped = false;
  let ticking: ReturnType<typeof setTimeout> | undefined;
  let pulse: Pulse | undefined;

  const send = (input: Input) => {
    if (isStopped) return;
    const [next, effects] = step(state, input, clock.nowMs(), benchView);
    state = next;
    for (const effect of effects) void carryOut(world, effect);
    if (input.on === "enrolled") pulse?.beat();
    for (const listener of listeners) listener();
    clearTimeout(ticking);
    ticking = setTimeout(() => send({ on: "tick" }), untilNextTick(state));
  };
  const world: World = {
    store,
    outbox,
    clock,
    fetcher: parts.fetcher,
    newId: parts.newId,
    state: () => state,
    send,
    nudge: () => sender.nudge(),
  };
  const sender = startSender({
    outbox,
    sealedFor: (sessions) => sealedSessions(store, sessions),
    post: (batch) =>
      ask({ path: "/api/kiosk/events", body: batch, answer: eventResults }, parts.fetcher),
    deviceTime: () => new Date(parts.clocks.wallMs()).toISOString(),
    nowMs: clock.nowMs,
    wait: waitOr,
    random: parts.random,
    // What could not be kept or read here is read anew at the next beat.
    onSettled: (settled) =>
      void keepSettled(world, settled)
        .then(() => refreshCell(world))
        .catch(() => undefined),
    onLink: (is) => send({ on: "link", is }),
  });
  send({ on: "started", known: await readKnown(world) });
  pulse = startPulse(world, parts);
  return {
    state: () => state,
    send,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    wake() {
      pulse?.beat();
      sender.nudge();
    },
    stop() {
      isStopped = true;
      clearTimeout(ticking);
      sender.stop();
      pulse?.stop();
      store.close();
    },
  };
}

/** The next whole second, or sooner where a screen or an undo runs out before it. */
function untilNextTick(state: KioskState): number {
  const { nowMs, undo } = state;
  const ends = [stayOf(state)?.untilMs, undo?.untilMs].flatMap((end) => (end ? [end - nowMs] : []));
  return Math.max(20, Math.min(SECOND_MS - (nowMs % SECOND_MS), ...ends));
}

/** Waits, or less when the signal fires; for ever when there is nothing to wait for. */
function waitOr(delayMs: number, early: AbortSignal): Promise<void> {
  if (early.aborted) return Promise.resolve();
  return new Promise((done) => {
    const timer = Number.isFinite(delayMs) ? setTimeout(done, delayMs) : undefined;
    early.addEventListener("abort", () => {
      clearTimeout(timer);
      done();
    });
  });
}

interface Pulse {
  /** Beats now: the network may be back, or this browser has just become a kiosk. */
  beat(): void;
  stop(): void;
}

/** Beats while the page lives, faster while the server is away; the first answer names our build. */
function startPulse(world: World, parts: MachineParts): Pulse {
  const state = { stopped: false, early: new AbortController(), beats: 0 };
  let build: string | null = null;
  const beat = async () => {
    if (!world.state().device) return;
    const wasAway = world.state().link.is !== "connected";
    const told = await takePulse(world, parts.clocks, build);
    if (!told) return;
    const isIdle = world.state().screen.at === "door" && world.state().pending.length === 0;
    if (build && told !== build && isIdle) parts.reload();
    build ??= told;
    state.beats += 1;
    await refreshCell(world);
    if (wasAway) world.nudge();
  };
  void (async () => {
    while (!state.stopped) {
      state.early = new AbortController();
      // A store or a network that breaks is asked again at the next beat.
      await beat().catch(() => undefined);
      await waitOr(pauseMs(world, state.beats), state.early.signal);
    }
  })();
  return {
    beat: () => state.early.abort(),
    stop() {
      state.stopped = true;
      state.early.abort();
    },
  };
}

function pauseMs(world: World, beats: number): number {
  if (!world.state().device) return Number.POSITIVE_INFINITY;
  if (world.state().link.is !== "connected") return PULSE_AWAY_MS;
  return beats < FIRST_BEATS ? SECOND_MS : PULSE_MS;
}
