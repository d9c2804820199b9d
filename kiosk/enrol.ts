import { keepEnrolment } from "@/kiosk/device";
import { ask } from "@/kiosk/server";
import { forgetSpentSessions } from "@/kiosk/sessions";
import type { World } from "@/kiosk/world";
import { enrolled } from "@/lib/kiosks/schema";

/**
 * Makes this browser a kiosk with a one-time code. Records that wait here were made under the
 * enrolment of before and are proved by its sessions: they are handed in first, unless the server
 * knows that enrolment no more. Then they go in under the new one, as loose ends for a lead.
 */
export async function enrolHere(world: World, code: string): Promise<void> {
  if (await mustHandInFirst(world)) {
    world.nudge();
    return world.send({ on: "enrol-refused", says: "kept" });
  }
  const question = { path: "/api/kiosk/enrol", body: { code }, answer: enrolled };
  const answer = await ask(question, world.fetcher);
  if (answer.came === "answer") {
    await leaveFormerEnrolment(world);
    const device = await keepEnrolment(world.store, answer.value);
    return world.send({ on: "enrolled", device });
  }
  const says = answer.came === "nothing" ? "away" : isThrottled(answer) ? "wait" : "wrong";
  world.send({ on: "enrol-refused", says });
}

async function mustHandInFirst({ state, outbox }: World): Promise<boolean> {
  const { device, link } = state();
  if (!device || link.is === "unknown-device") return false;
  return (await outbox.count()) > 0;
}

/** No badge opens a session of another kiosk, and nothing of another cell is shown. */
async function leaveFormerEnrolment({ store, clock }: World): Promise<void> {
  const tx = store.transaction(["sessions", "benches", "cell"], "readwrite");
  const sessions = tx.objectStore("sessions");
  for (const session of await sessions.getAll()) {
    await sessions.put({ ...session, endedMs: session.endedMs ?? clock.nowMs() });
  }
  await tx.objectStore("benches").clear();
  await tx.objectStore("cell").clear();
  await tx.done;
  await forgetSpentSessions(store, clock.nowMs());
}

function isThrottled(answer: { came: string; status?: number }): boolean {
  return answer.status === 429;
}
