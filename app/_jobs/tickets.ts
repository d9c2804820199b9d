import "server-only";
import { every, type Round } from "@/app/_jobs/every";
import { database } from "@/app/_server/database";
import { judgeMarkedTickets } from "@/db/tickets/commands";

const held = globalThis as typeof globalThis & { bookmatchJudge?: Round };

/** Judges the tickets that bookings marked: every second, and right after a booking of this process. */
export function startJudging(): Round {
  held.bookmatchJudge ??= every("tickets", 1, judgeAll);
  return held.bookmatchJudge;
}

/** Says that a booking marked tickets, so that they are judged without waiting. */
export function nudgeJudge(): void {
  held.bookmatchJudge?.nudge();
}

async function judgeAll(): Promise<void> {
  while ((await judgeMarkedTickets(database())) > 0);
}
