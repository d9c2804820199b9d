import "server-only";
import { every } from "@/app/_jobs/every";
import { retryBoxes } from "@/app/_jobs/kiosks";
import { openPeriods } from "@/app/_jobs/periods";
import { startSumming } from "@/app/_jobs/seam";
import { startJudging } from "@/app/_jobs/tickets";
import { closeForgottenShifts } from "@/app/_jobs/timeline";
import { database } from "@/app/_server/database";
import { clearOldTries } from "@/db/access/commands";
import { makePartitions } from "@/db/jobs/commands";

const HALF_MINUTE = 30;
const MINUTE = 60;
const HOUR = 3600;
const DAY = 86_400;

const held = globalThis as typeof globalThis & { bookmatchJobs?: () => Promise<void> };

/**
 * Starts what goes on in the background of this process, once. Each job may run in several processes
 * at a time. The answer stops them and waits for what is under way.
 */
export function startJobs(): () => Promise<void> {
  held.bookmatchJobs ??= begin();
  return held.bookmatchJobs;
}

function begin(): () => Promise<void> {
  const rounds = [
    every("partitions", DAY, () => makePartitions(database(), new Date())),
    startJudging(),
    startSumming(),
    every("timeline", MINUTE, closeForgottenShifts),
    every("periods", HOUR, openPeriods),
    every("boxes", HALF_MINUTE, retryBoxes),
    every("tries", DAY, () => clearOldTries(database(), new Date())),
  ];
  return async () => {
    await Promise.all(rounds.map((round) => round.stop()));
  };
}
