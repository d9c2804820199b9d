import "server-only";
import { every, type Round } from "@/app/_jobs/every";
import { database } from "@/app/_server/database";
import { sumMarked } from "@/db/seam/commands";

/** Between two rounds, in seconds: what is booked within it is summed once. */
const PAUSE = 2;

/** Sums the days whose parts changed: within seconds, as the pages say. */
export function startSumming(): Round {
  return every("seam", PAUSE, sumAll);
}

async function sumAll(): Promise<void> {
  while ((await sumMarked(database())) > 0);
}
