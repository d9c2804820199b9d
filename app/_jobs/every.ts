import "server-only";
import { log } from "@/app/_server/log";

/** A job that comes round; never twice at once in one process. */
export interface Round {
  /** Lets it run as soon as it may, without waiting for its time. */
  nudge(): void;
  /** Lets a run that is under way finish, and starts no other. */
  stop(): Promise<void>;
}

/**
 * Runs a job at once, then each time so many seconds after it ended, and whenever it is nudged. What
 * it throws is logged, and it comes round again: a database that was away is back some time.
 */
export function every(name: string, seconds: number, run: () => Promise<void>): Round {
  const state = { isStopped: false, isNudged: false, timer: setTimeout(begin, 0) };
  let running: Promise<void> | null = null;

  function begin(): void {
    clearTimeout(state.timer);
    if (state.isStopped || running) return;
    state.isNudged = false;
    running = run()
      .catch((error: unknown) => log().warn({ err: error, job: name }, "a job failed"))
      .finally(() => {
        running = null;
        state.timer = setTimeout(begin, state.isNudged ? 0 : seconds * 1000);
        state.timer.unref();
      });
  }

  return {
    nudge() {
      state.isNudged = true;
      begin();
    },
    async stop() {
      state.isStopped = true;
      clearTimeout(state.timer);
      await running;
    },
  };
}
