import "server-only";
import { every, type Round } from "@/app/_jobs/every";
import { database } from "@/app/_server/database";
import { CLAIM_MAX, judgeMarkedTickets } from "@/db/tickets/commands";

const held = globalThis as typeof globalThis & { bookmatchJudge?: Round };

/**
 * Taps come faster than this on a busy floor; one run then judges all their tickets, each once, where
 * a run for every tap would cost more than booking it.
 */
const REST_MS = 400;

/** Judges the tickets that bookings marked: every second, and soon after a booking of this process. */
export function startJudging(): Round {
  held.bookmatchJudge ??= every("tickets", 1, judgeAll, REST_MS);
  return held.bookmatchJudge;
}

/** Says that a booking marked tickets, so that they are judged without waiting. */
export function nudgeJudge(): void {
  held.bookmatchJudge?.nudge();
}

async function judgeAll(): Promise<void> {
  // a run that could claim no more than there were has left nothing behind
  while ((await judgeMarkedTickets(database())) === CLAIM_MAX);
}
