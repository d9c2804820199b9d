import { keepBench } from "@/kiosk/bench-cache";
import { ask } from "@/kiosk/server";
import { endSessions, forgetSpentSessions, keepSession } from "@/kiosk/sessions";
import type { World } from "@/kiosk/world";
import type { BenchSession } from "@/lib/bench/schema";
import { bench, type SignedIn, signedIn } from "@/lib/kiosks/schema";

/** A person waits at the screen: a server that does not answer by then is taken to be away. */
const SIGN_IN_TIMEOUT_MS = 6000;
const AWAY_TIMEOUT_MS = 2500;

/**
 * Opens a session with number and PIN. While the server is away the PIN is sealed for it instead,
 * under the same session, and checked when the records are handed in (LEDGER.md 9).
 */
export async function signIn(world: World, worker: string, pin: string): Promise<void> {
  const session = world.newId();
  const isAway = world.state().link.is === "away";
  const answer = await ask(
    {
      path: "/api/kiosk/sign-in",
      body: { session, worker, pin },
      answer: signedIn,
      timeoutMs: isAway ? AWAY_TIMEOUT_MS : SIGN_IN_TIMEOUT_MS,
    },
    world.fetcher,
  );
  if (answer.came === "answer") return openWithToken(world, session, answer.value);
  if (answer.came === "nothing") return openSealed(world, { session, worker, pin });
  const waitSeconds = answer.came === "problem" ? answer.retryAfterSeconds : null;
  world.send({ on: "sign-in-refused", worker, says: "wrong", waitSeconds });
}

async function openWithToken(
  world: World,
  session: string,
  { token, worker: who, bench: fresh }: SignedIn,
): Promise<void> {
  const opened: BenchSession = {
    session,
    ...who,
    openedMs: world.clock.nowMs(),
    endedMs: null,
    token,
    sealed: null,
  };
  await keepSession(world.store, opened);
  await keepBench(world.store, who.worker, fresh, world.clock.nowMs());
  world.send({ on: "signed-in", session: opened, bench: fresh });
}

async function openSealed(
  world: World,
  { session, worker, pin }: { session: string; worker: string; pin: string },
): Promise<void> {
  const { device, cell } = world.state();
  const person = cell?.people.find((each) => each.worker === worker);
  try {
    if (!device) throw new RangeError("openSealed: this tablet is not enrolled");
    const { sealPin } = await import("@/lib/kiosks/seal-format");
    const boundTo = { siteId: device.site.id, kioskId: device.deviceId, worker, session };
    const opened: BenchSession = {
      session,
      worker,
      name: person?.name ?? worker,
      language: person?.language ?? "",
      role: "worker",
      openedMs: world.clock.nowMs(),
      endedMs: null,
      token: null,
      sealed: await sealPin(pin, device.sealKey, boundTo),
    };
    await keepSession(world.store, opened);
    world.send({ on: "signed-in", session: opened, bench: null });
  } catch {
    world.send({ on: "sign-in-refused", worker, says: "away", waitSeconds: null });
  }
}

/** Reads a worker's bench anew; the server may say that the session is over. */
export async function fetchBench(world: World, worker: string): Promise<void> {
  const token = world.state().sessions[worker]?.token;
  if (!token) return;
  const answer = await ask({ path: "/api/kiosk/bench", token, answer: bench }, world.fetcher);
  if (answer.came === "answer") {
    await keepBench(world.store, worker, answer.value, world.clock.nowMs());
    world.send({ on: "bench", worker, bench: answer.value });
  }
  if (answer.came === "problem" && answer.status === 401) {
    await endSessions(world.store, worker, world.clock.nowMs());
    world.send({ on: "session-over", worker });
  }
}

/** The shift is over: the badge opens nothing any more, and what is spent is forgotten. */
export async function closeSessions(world: World, worker: string): Promise<void> {
  await endSessions(world.store, worker, world.clock.nowMs());
  await forgetSpentSessions(world.store, world.clock.nowMs());
}
