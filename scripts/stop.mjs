import { runningRecord, stopCluster } from "./ground/installation.mjs";
import { endLeftovers, endProcess } from "./ground/leftovers.mjs";
import { checkFolders } from "./ground/place.mjs";
import { isAlive } from "./ground/process-record.mjs";
import { main, say } from "./ground/say.mjs";

/** Its supervisor has the web server and the cluster to stop, each in its own time. */
const SUPERVISOR_MS = 60_000;

/** `npm stop`: ends a running Bookmatch as Ctrl-C does, and whatever a killed one left behind. */
await main(async () => {
  checkFolders();
  const record = runningRecord();
  const running = record.read();
  const wasRunning = isAlive(running?.supervisor);
  const hadLeftovers = !wasRunning && isAlive(running?.server);
  await endProcess(running?.supervisor, SUPERVISOR_MS);
  await endLeftovers(running);
  await stopCluster();
  record.remove();
  say(wasRunning || hadLeftovers ? "Bookmatch is stopped." : "Bookmatch was not running.");
});
