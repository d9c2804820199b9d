import { runChecks } from "./ground/checks.mjs";
import { main } from "./ground/say.mjs";
import { newTally, report, stage } from "./ground/stages.mjs";
import { runVitest } from "./ground/vitest.mjs";

/** `npm run check`: what takes seconds and no database: format, lint, types, dead code, order. */
await main(async () => {
  const tally = newTally();
  await stage(tally, "check", runChecks);
  const order = ["--project", "unit", "tests/tidy.test.ts", "tests/directions.test.ts"];
  await stage(tally, "order of the house", () => runVitest(order));
  return report(tally);
});
