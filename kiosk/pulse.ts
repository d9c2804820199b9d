import { findCell, keepCell } from "@/kiosk/bench-cache";
import type { RoundTrip } from "@/kiosk/clock";
import { changeDevice } from "@/kiosk/device";
import { type Answer, ask } from "@/kiosk/server";
import type { World } from "@/kiosk/world";
import type { Link } from "@/lib/bench/schema";
import { type KioskTime, kioskCell, kioskTime } from "@/lib/kiosks/schema";
import { instantMs } from "@/lib/time/instant";

/** The tablet's two clocks, at a round trip. */
export interface PulseClocks {
  wallMs(): number;
  monotonicMs(): number;
}

const TIMEOUT_MS = 8000;

/**
 * Asks the server for its time, and says what this tablet is: its build, what waits, its battery.
 * The round trip measures the clock; the answer, or none, is the state of the connection.
 *
 * @returns the build that the server runs; null when it did not answer
 */
export async function takePulse(
  world: World,
  clocks: PulseClocks,
  build: string | null,
): Promise<string | null> {
  const sentMonotonicMs = clocks.monotonicMs();
  const path = `/api/kiosk/time?${await aboutThisTablet(world, build)}`;
  const answer = await ask({ path, answer: kioskTime, timeoutMs: TIMEOUT_MS }, world.fetcher);
  const [gotMonotonicMs, gotWallMs] = [clocks.monotonicMs(), clocks.wallMs()];
  world.send({ on: "link", is: linkOf(answer) });
  if (answer.came !== "answer") return null;
  const serverMs = instantMs(answer.value.serverTime) ?? gotWallMs;
  const trip: RoundTrip = { sentMonotonicMs, gotMonotonicMs, gotWallMs, serverMs };
  world.clock.measured(trip);
  await keepSealKey(world, answer.value);
  return answer.value.build;
}

function linkOf(answer: Answer<unknown>): Link["is"] {
  if (answer.came === "nothing") return "away";
  return answer.came === "problem" && answer.status === 401 ? "unknown-device" : "connected";
}

async function aboutThisTablet(world: World, build: string | null): Promise<URLSearchParams> {
  const about = new URLSearchParams({ queued: String(await world.outbox.count()) });
  if (build) about.set("build", build);
  const battery = await batteryPercent();
  if (battery !== null) about.set("battery", String(battery));
  return about;
}

/** The battery's charge where the browser tells it. */
async function batteryPercent(): Promise<number | null> {
  if (!("getBattery" in navigator)) return null;
  // safe because the Battery Status API gives a manager with `level` from 0 to 1
  const asked = (navigator as { getBattery(): Promise<{ level: number }> }).getBattery();
  return asked.then(({ level }) => Math.round(level * 100)).catch(() => null);
}

/** Keeps the server's present key: a PIN keyed while it is away is sealed with it. */
async function keepSealKey(world: World, { sealKey }: KioskTime): Promise<void> {
  if (world.state().device?.sealKey.kid === sealKey.kid) return;
  const device = await changeDevice(world.store, { sealKey });
  if (device) world.send({ on: "device", device });
}

/** Reads the cell anew, if it changed: its people, its tickets, what is next. */
export async function refreshCell(world: World): Promise<void> {
  const kept = await findCell(world.store);
  const question = { path: "/api/kiosk/cell", answer: kioskCell, etag: kept?.etag ?? null };
  const answer = await ask(question, world.fetcher);
  if (answer.came !== "answer") return;
  await keepCell(world.store, answer.value, answer.etag, world.clock.nowMs());
  world.send({ on: "cell", cell: answer.value });
}
