import type { Draft } from "@/kiosk/outbox";
import type { World } from "@/kiosk/world";
import { withWeights } from "@/lib/bench/weights";
import type { EventBody } from "@/lib/ledger/schema";
import type { Effect } from "@/lib/taps/inputs";

/**
 * Writes acts down: all of them are on this tablet's disk, or none is and the screen says so. Only
 * then is the sender told, so that nothing is handed in that a reload could forget.
 */
export async function recordActs(
  world: World,
  { bodies, worker, session, note }: Extract<Effect, { do: "record" }>,
): Promise<void> {
  const drafts = bodies.map((body) => draftOf(world, body, { worker, session, note }));
  try {
    const events = await world.outbox.add(drafts);
    world.send({ on: "recorded", events });
    world.nudge();
  } catch {
    world.send({ on: "not-recorded" });
  }
}

function draftOf(
  world: World,
  body: EventBody,
  { note, ...who }: { worker: string; session: string; note: string | undefined },
): Draft {
  const { atMs, clock } = world.clock.stamp();
  const state = world.state();
  const weighed = state.link.is === "connected" ? body : withWeights(state, body);
  return {
    id: world.newId(),
    v: 1,
    ...who,
    at: new Date(atMs).toISOString(),
    clock,
    ...(note === undefined ? {} : { note }),
    ...weighed,
  } as Draft; // safe because the spread of a body keeps its kind and fields together
}
