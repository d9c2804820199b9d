import { changeDevice } from "@/kiosk/device";
import { enrolHere } from "@/kiosk/enrol";
import { findTicketAnywhere } from "@/kiosk/find-ticket";
import { recordActs } from "@/kiosk/record";
import { closeSessions, fetchBench, signIn } from "@/kiosk/sign-in";
import { play } from "@/kiosk/sound";
import type { World } from "@/kiosk/world";
import type { Effect } from "@/lib/taps/inputs";

/** Does in the world what the reducer asks for; the answer comes back as an input. */
export async function carryOut(world: World, effect: Effect): Promise<void> {
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
