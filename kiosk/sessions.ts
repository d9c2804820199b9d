import type { Store } from "@/kiosk/store";
import type { BenchSession } from "@/lib/bench/schema";

/** A session holds 16 hours at most, whatever became of the shift (LEDGER.md 9). */
export const SESSION_MAX_MS = 16 * 3_600_000;

/** Keeps a session; one worker has one open session on a kiosk, the latest. */
export async function keepSession(store: Store, session: BenchSession): Promise<void> {
  await store.put("sessions", session);
}

/** Lists the sessions that a badge may reopen: not ended, not too old, the latest of each worker. */
export async function listOpenSessions(store: Store, nowMs: number): Promise<BenchSession[]> {
  const sessions = await store.getAll("sessions");
  const open = sessions.filter(
    ({ endedMs, openedMs }) => endedMs === null && nowMs - openedMs < SESSION_MAX_MS,
  );
  const latest = new Map<string, BenchSession>();
  for (const session of open.toSorted((a, b) => a.openedMs - b.openedMs)) {
    latest.set(session.worker, session);
  }
  return [...latest.values()];
}

/** Ends all sessions of a worker on this kiosk; their records may still wait in the outbox. */
export async function endSessions(store: Store, worker: string, nowMs: number): Promise<void> {
  const tx = store.transaction("sessions", "readwrite");
  for (const session of await tx.store.getAll()) {
    if (session.worker === worker && session.endedMs === null) {
      await tx.store.put({ ...session, endedMs: nowMs });
    }
  }
  await tx.done;
}

/** The sealed credentials among these sessions, as a batch carries them. */
export async function sealedSessions(
  store: Store,
  sessions: readonly string[],
): Promise<{ session: string; worker: string; sealed: string }[]> {
  const kept = await Promise.all(sessions.map((session) => store.get("sessions", session)));
  return kept.flatMap((found) => {
    if (!found?.sealed) return [];
    return [{ session: found.session, worker: found.worker, sealed: found.sealed }];
  });
}

/** Forgets sessions that ended or grew old and have no record left to prove. */
export async function forgetSpentSessions(store: Store, nowMs: number): Promise<void> {
  const waiting = new Set((await store.getAll("outbox")).map(({ event }) => event.session));
  const tx = store.transaction("sessions", "readwrite");
  for (const { session, endedMs, openedMs } of await tx.store.getAll()) {
    const isSpent = endedMs !== null || nowMs - openedMs >= SESSION_MAX_MS;
    if (isSpent && !waiting.has(session)) await tx.store.delete(session);
  }
  await tx.done;
}
