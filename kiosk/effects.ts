import { changeDevice } from "@/kiosk/device";
import { enrolHere } from "@/kiosk/enrol";
import { findTicketAnywhere } from "@/kiosk/find-ticket";
import { recordActs } from "@/kiosk/record";
import { closeSessions, fetchBench, signIn } from "@/kiosk/sign-in";
import { play } from "@/kiosk/sound";
import type { World } from "@/kiosk/world";
import type { Effect, Input } from "@/lib/taps/inputs";

/**
 * Does in the world what the reducer asks for; the answer comes back as an input. Where the tablet
 * itself breaks on the way, a person who waits is told that it cannot be done now.
 */
export async function carryOut(world: World, effect: Effect): Promise<void> {
  try {
    await run(world, effect);
  } catch {
    const answer = brokenOff(effect);
    if (answer) world.send(answer);
  }
}

/** What a person hears who waits for an effect that broke; null where nobody does. */
function brokenOff(effect: Effect): Input | null {
  switch (effect.do) {
    case "record":
      return { on: "not-recorded" };
    case "sign-in":
      return { on: "sign-in-refused", worker: effect.worker, says: "away", waitSeconds: null };
    case "find-ticket":
      return { on: "no-ticket", code: effect.code, away: true };
    case "enrol":
      return { on: "enrol-refused", says: "away" };
    default:
      return null;
  }
}

async function run(world: World, effect: Effect): Promise<void> {
  switch (effect.do) {
    case "record":
      return recordActs(world, effect);
    case "sign-in":
      return signIn(world, effect.worker, effect.pin);
    case "find-ticket":
      return findTicketAnywhere(world, effect.code, effect.worker);
    case "fetch-bench":
      return fetchBench(world, effect.worker);
    case "enrol":
      return enrolHere(world, effect.code);
    case "end-sessions":
      return closeSessions(world, effect.worker);
    case "mute":
      await changeDevice(world.store, { muted: effect.muted });
      return;
    case "sound":
      if (!world.state().device?.muted) play(effect.sound);
  }
}
