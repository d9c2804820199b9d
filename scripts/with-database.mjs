import { isInstalled, openInstallation, runningRecord } from "./ground/installation.mjs";
import { areModulesCurrent } from "./ground/modules.mjs";
import { checkFolders } from "./ground/place.mjs";
import { isAlive } from "./ground/process-record.mjs";
import { runScript } from "./ground/programs.mjs";
import { main, Stop } from "./ground/say.mjs";

/**
 * Runs a program of this folder against the installation's database, whether Bookmatch is running
 * or stopped: `node scripts/with-database.mjs key.ts --role planner`.
 */
await main(async () => {
  checkFolders();
  const [name, ...args] = process.argv.slice(2);
  if (!areModulesCurrent() || !isInstalled())
    throw new Stop("There is no Bookmatch here yet. Start it once: npm start");
  const { env, close } = await openInstallation();
  try {
    const { code, text } = await runScript(name, args, env, { mayFail: true, talk: true });
    process.stdout.write(text);
    return code;
  } finally {
    if (!isAlive(runningRecord().read()?.supervisor)) await close();
  }
});
