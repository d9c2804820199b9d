import { say } from "./say.mjs";

/** What a shell calls a program that ended by Ctrl-C. */
const INTERRUPTED = 130;

/**
 * What a test run has counted and how long its stages took.
 *
 * @param {{isOver: boolean}} [leaving] the person who may stop it before its end
 */
export function newTally(leaving = { isOver: false }) {
  return { passed: 0, failed: 0, failures: [], minutes: [], leaving };
}

/**
 * Runs a stage of the tests and keeps its time. What it throws is a failure of that stage: the
 * later ones still run, so that one look shows everything that is wrong. Who has left gets no more.
 *
 * @param {ReturnType<typeof newTally>} tally
 * @param {string} name
 * @param {() => Promise<{passed: number, failed: number, failures: string[]}>} work
 * @returns {Promise<boolean>} whether all of it passed
 */
export async function stage(tally, name, work) {
  if (tally.leaving.isOver) return false;
  say(`\n── ${name}`);
  const start = performance.now();
  const found = await work().catch((error) => ({
    passed: 0,
    failed: 1,
    failures: [`${name}: ${error.message ?? error}`],
  }));
  tally.minutes.push({ name, minutes: (performance.now() - start) / 60_000 });
  tally.passed += found.passed;
  tally.failed += found.failed;
  tally.failures.push(...found.failures);
  return found.failed === 0;
}

/** Prints minutes per stage, what failed and what to do about it, and as the last line the counts. */
export function report(tally) {
  if (tally.leaving.isOver) {
    say("Stopped before the end: this says nothing of the tests.");
    return INTERRUPTED;
  }
  say("\n── minutes");
  for (const { name, minutes } of tally.minutes) say(`${minutes.toFixed(1).padStart(6)}  ${name}`);
  const total = tally.minutes.reduce((sum, { minutes }) => sum + minutes, 0);
  say(`${total.toFixed(1).padStart(6)}  in all`);
  if (tally.failures.length > 0) say(`\n── failed\n${tally.failures.join("\n")}`);
  process.stdout.write(`${tally.passed} passed, ${tally.failed} failed\n`);
  return tally.failed === 0 ? 0 : 1;
}
