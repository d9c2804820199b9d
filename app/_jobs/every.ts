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
 * Runs a job at once, then each time so many seconds after it ended, and when it is nudged: then not
 * sooner than `restMs` after it ended, so that many nudges make one run. What it throws is logged,
 * and it comes round again: a database that was away is back some time.
 */
export function every(name: string, seconds: number, run: () => Promise<void>, restMs = 0): Round {
  const state = { isStopped: false, isNudged: false, endedMs: 0, timer: setTimeout(begin, 0) };
  let running: Promise<void> | null = null;

  function begin(): void {
    clearTimeout(state.timer);
    if (state.isStopped || running) return;
    state.isNudged = false;
    running = run()
      .catch((error: unknown) => log().warn({ err: error, job: name }, "a job failed"))
      .finally(() => {
        running = null;
        state.endedMs = performance.now();
        beginIn(state.isNudged ? restMs : seconds * 1000);
      });
  }

  function beginIn(ms: number): void {
    clearTimeout(state.timer);
    if (state.isStopped) return;
    state.timer = setTimeout(begin, ms);
    state.timer.unref();
  }

  return {
    nudge() {
      if (state.isNudged) return;
      state.isNudged = true;
      if (!running) beginIn(Math.max(0, state.endedMs + restMs - performance.now()));
    },
    async stop() {
      state.isStopped = true;
      clearTimeout(state.timer);
      await running;
    },
  };
}
