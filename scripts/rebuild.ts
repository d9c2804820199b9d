import { rebuild } from "@/db/timeline/rebuild";
import { sum } from "@/lib/sum";
import { command, say, withSite } from "./ground/connect";

/**
 * `npm run db:rebuild`: derives everything that follows from the ledger again, for everyone. It must
 * change nothing; what it does change is counted on standard output.
 */
await command(async () => {
  say("Deriving timelines, tickets and loose ends from the ledger again …");
  const changed = await withSite(rebuild);
  process.stdout.write(`${JSON.stringify(changed)}\n`);
  const rows = sum(Object.values(changed));
  say(rows === 0 ? "Nothing changed." : `${rows} rows were not what the ledger says, and are now.`);
});
