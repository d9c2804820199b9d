import { keepEnrolment } from "@/kiosk/device";
import { ask } from "@/kiosk/server";
import type { World } from "@/kiosk/world";
import { enrolled } from "@/lib/kiosks/schema";

/** Makes this browser a kiosk with a one-time code. */
export async function enrolHere(world: World, code: string): Promise<void> {
  const question = { path: "/api/kiosk/enrol", body: { code }, answer: enrolled };
  const answer = await ask(question, world.fetcher);
  if (answer.came === "answer") {
    const device = await keepEnrolment(world.store, answer.value);
    return world.send({ on: "enrolled", device });
  }
  const says = answer.came === "nothing" ? "away" : isThrottled(answer) ? "wait" : "wrong";
  world.send({ on: "enrol-refused", says });
}

function isThrottled(answer: { came: string; status?: number }): boolean {
  return answer.status === 429;
}
