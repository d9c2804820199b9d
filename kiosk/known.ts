import { findCell, keepBench, listBenches } from "@/kiosk/bench-cache";
import { findDevice } from "@/kiosk/device";
import type { Settled } from "@/kiosk/outbox";
import { listOpenSessions } from "@/kiosk/sessions";
import type { World } from "@/kiosk/world";
import type { Bench } from "@/lib/kiosks/schema";
import type { Known } from "@/lib/taps/inputs";

/** Reads all that this browser kept, for the start of the page. */
export async function readKnown(world: World): Promise<Known> {
  await world.outbox.takeBack();
  const [device, cell, sessions, benches, pending] = await Promise.all([
    findDevice(world.store),
    findCell(world.store),
    listOpenSessions(world.store, world.clock.nowMs()),
    listBenches(world.store),
    world.outbox.oldest(Number.POSITIVE_INFINITY, true),
  ]);
  return {
    device,
    cell: cell?.cell ?? null,
    sessions,
    benches: Object.fromEntries(benches.map(({ worker, bench }) => [worker, bench])),
    pending,
  };
}

/** Keeps the benches that came with a batch's answer, and tells the reducer what was settled. */
export async function keepSettled(world: World, settled: readonly Settled[]): Promise<void> {
  const benches: Record<string, Bench> = {};
  for (const { event, result } of settled) {
    if (result.bench) benches[event.worker] = result.bench;
  }
  const ids = settled.map(({ event }) => event.id);
  world.send({ on: "settled", ids, benches });
  for (const [worker, bench] of Object.entries(benches)) {
    await keepBench(world.store, worker, bench, world.clock.nowMs());
  }
}
