import { readFileSync } from "node:fs";

/** One published check: its source stands beside its figures. */
interface Check {
  id: string;
  source: string;
  given: Record<string, unknown>;
  expect: Record<string, unknown>;
}

const path = new URL("../../checks/time.json", import.meta.url);
const checks: Check[] = JSON.parse(readFileSync(path, "utf8"));

/** Finds a check of `tests/checks/time.json` by its id. */
export function timeCheck<G, E>(id: string): { source: string; given: G; expect: E } {
  const check = checks.find((one) => one.id === id);
  if (!check) throw new Error(`tests/checks/time.json has no check "${id}"`);
  // safe because each test names the shape of the one check that it asks for
  return { source: check.source, given: check.given as G, expect: check.expect as E };
}

/** Lists the checks whose id begins with `prefix`. */
export function timeChecks<G, E>(prefix: string) {
  return checks
    .filter(({ id }) => id.startsWith(prefix))
    .map(({ id }) => ({ id, ...timeCheck<G, E>(id) }));
}
