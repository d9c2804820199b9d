import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { every } from "@/app/_jobs/every";

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

/** A job whose runs are counted, each as long as `ms`. */
function counted(ms = 0) {
  const job = {
    runs: 0,
    run: async () => {
      job.runs += 1;
      await new Promise<void>((resolve) => setTimeout(resolve, ms));
    },
  };
  return job;
}

describe("every", () => {
  test("runs at once, and again so many seconds after it ended", async () => {
    const job = counted(500);
    const round = every("job", 1, job.run);
    await vi.advanceTimersByTimeAsync(0);
    expect(job.runs).toBe(1);
    await vi.advanceTimersByTimeAsync(1499);
    expect(job.runs).toBe(1);
    await vi.advanceTimersByTimeAsync(1);
    expect(job.runs).toBe(2);
    await Promise.all([round.stop(), vi.advanceTimersByTimeAsync(500)]);
  });

  test("many nudges make one run, after the rest", async () => {
    const job = counted();
    const round = every("job", 60, job.run, 400);
    await vi.advanceTimersByTimeAsync(1);
    for (let nudges = 0; nudges < 20; nudges += 1) round.nudge();
    await vi.advanceTimersByTimeAsync(398);
    round.nudge();
    expect(job.runs).toBe(1);
    await vi.advanceTimersByTimeAsync(2);
    expect(job.runs).toBe(2);
    await vi.advanceTimersByTimeAsync(59_000);
    expect(job.runs).toBe(2);
    await round.stop();
  });

  test("a nudge long after the last run runs at once; one in a run is not forgotten", async () => {
    const job = counted(100);
    const round = every("job", 60, job.run, 400);
    await vi.advanceTimersByTimeAsync(10_000);
    round.nudge();
    await vi.advanceTimersByTimeAsync(1);
    expect(job.runs).toBe(2);
    round.nudge();
    await vi.advanceTimersByTimeAsync(500);
    expect(job.runs).toBe(3);
    await Promise.all([round.stop(), vi.advanceTimersByTimeAsync(100)]);
  });

  test("stopped, it runs no more, however it is nudged", async () => {
    const job = counted();
    const round = every("job", 1, job.run, 400);
    await vi.advanceTimersByTimeAsync(1);
    await round.stop();
    round.nudge();
    await vi.advanceTimersByTimeAsync(10_000);
    expect(job.runs).toBe(1);
  });
});
