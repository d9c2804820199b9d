import type { Outbox, Settled } from "@/kiosk/outbox";
import type { Answer } from "@/kiosk/server";
import type { Link } from "@/lib/bench/schema";
import type { EventResults } from "@/lib/kiosks/schema";
import { BATCH_MAX, type ClockEvent, type EventBatch } from "@/lib/ledger/schema";

type SealedSession = NonNullable<EventBatch["sessions"]>[number];

/** The seams at which the sender meets the world: a test passes its own. */
export interface SenderParts {
  outbox: Outbox;
  /** The sealed credentials of the sessions that have no token of the server's. */
  sealedFor(sessions: readonly string[]): Promise<SealedSession[]>;
  post(batch: EventBatch): Promise<Answer<EventResults>>;
  deviceTime(): string;
  nowMs(): number;
  /** Waits; resolves early when the signal fires. */
  wait(delayMs: number, early: AbortSignal): Promise<void>;
  random(): number;
  /** Told after the records have left the outbox. */
  onSettled(settled: readonly Settled[]): void;
  onLink(link: Link["is"]): void;
}

export interface Sender {
  /** Says that there is something to hand in, or that the network may be back. */
  nudge(): void;
  stop(): void;
}

/** A request's body stays well under the server's 1 MB. */
const BATCH_BYTES = 400_000;
const FIRST_DELAY_MS = 1000;
const LONGEST_DELAY_MS = 15_000;
/** A tablet that the server does not know asks rarely: a person must enrol it first. */
const UNKNOWN_DELAY_MS = 60_000;

/** The batch itself is at fault: not JSON, too large, or not in the form (API.md). */
const UNREADABLE = new Set([400, 413, 422]);

type Outcome = "idle" | "more" | Exclude<Link["is"], "connected">;

/**
 * Hands the outbox in, oldest first, for as long as the page lives:
 * idle -(nudge)-> hand in -> more -> … -> idle; away or unknown device -> wait -> hand in again.
 * A batch that was not answered is sent again with the same ids, which books it once. No
 * transaction is open during a request, so that a tap is never kept waiting by the network.
 */
export function startSender(parts: SenderParts): Sender {
  const state = { stopped: false, early: new AbortController(), failures: 0, limit: BATCH_MAX };
  void (async () => {
    while (!state.stopped) {
      state.early = new AbortController();
      // A store that breaks in the middle loses nothing: the records are still there next time.
      const outcome = await handIn(parts, state).catch((): Outcome => "away");
      state.failures = outcome === "away" ? state.failures + 1 : 0;
      if (outcome === "more" || state.stopped) continue;
      await parts.wait(delayMs(outcome, state.failures, parts.random()), state.early.signal);
    }
  })();
  return {
    nudge: () => state.early.abort(),
    stop() {
      state.stopped = true;
      state.early.abort();
    },
  };
}

/** How long to wait after an outcome: doubling with jitter, so that tablets do not come as one. */
function delayMs(outcome: Outcome, failures: number, random: number): number {
  if (outcome === "idle") return Number.POSITIVE_INFINITY;
  if (outcome === "unknown-device") return UNKNOWN_DELAY_MS;
  const longest = Math.min(LONGEST_DELAY_MS, FIRST_DELAY_MS * 2 ** (failures - 1));
  return longest * (0.5 + random / 2);
}

async function handIn(parts: SenderParts, state: { limit: number }): Promise<Outcome> {
  const batch = fitting(await parts.outbox.oldest(state.limit));
  if (batch.length === 0) return "idle";
  const sealed = await parts.sealedFor([...new Set(batch.map(({ session }) => session))]);
  const answer = await parts.post({
    events: batch,
    deviceTime: parts.deviceTime(),
    ...(sealed.length > 0 ? { sessions: sealed } : {}),
  });
  if (answer.came === "answer") {
    parts.onLink("connected");
    state.limit = BATCH_MAX;
    return settle(parts, batch, answer.value);
  }
  if (answer.came === "problem" && (answer.status === 401 || answer.status === 403)) {
    parts.onLink("unknown-device");
    return "unknown-device";
  }
  if (answer.came === "problem" && UNREADABLE.has(answer.status)) {
    parts.onLink("connected");
    return divide(parts, state, batch);
  }
  parts.onLink("away");
  return "away";
}

/** Settles what was answered; an answer that leaves records out is followed by another try. */
async function settle(
  parts: SenderParts,
  batch: readonly ClockEvent[],
  { results }: EventResults,
): Promise<Outcome> {
  // An unreadable record is answered under another id: the order says which it is (LEDGER.md 1).
  const inOrder = results.length === batch.length;
  const settled = batch.flatMap((event, place) => {
    const result = inOrder ? results[place] : results.find(({ id }) => id === event.id);
    return result ? [{ event, result }] : [];
  });
  await parts.outbox.settle(settled);
  parts.onSettled(settled);
  return settled.length > 0 ? "more" : "away";
}

/** A batch that the server refuses as a whole is halved until the record at fault stands alone. */
async function divide(
  parts: SenderParts,
  state: { limit: number },
  batch: readonly ClockEvent[],
): Promise<Outcome> {
  const [first] = batch;
  if (batch.length === 1 && first) {
    await parts.outbox.setAside(first.id, parts.nowMs());
    state.limit = BATCH_MAX;
  } else {
    state.limit = Math.ceil(batch.length / 2);
  }
  return "more";
}

/** As many of the oldest records as fit one request; always at least one. */
function fitting(events: readonly ClockEvent[]): ClockEvent[] {
  let bytes = 0;
  return events.filter((event, place) => {
    bytes += JSON.stringify(event).length;
    return place === 0 || bytes <= BATCH_BYTES;
  });
}
