import { isAlive } from "./process-record.mjs";
import { pause } from "./run.mjs";
import { say } from "./say.mjs";

/** How long a process may take to end by itself. */
const END_MS = 15_000;

/** Ends a process of ours and waits for it: asked first, then without asking. */
export async function endProcess(identity, withinMs = END_MS) {
  if (!isAlive(identity)) return;
  process.kill(identity.pid, "SIGTERM");
  for (const until = Date.now() + withinMs; Date.now() < until; await pause(100))
    if (!isAlive(identity)) return;
  process.kill(identity.pid, "SIGKILL");
  while (isAlive(identity)) await pause(50);
}

/** Ends a web server whose supervisor was killed: it would keep the port. */
export async function endLeftovers(record) {
  if (!isAlive(record?.server)) return;
  say("Ending a web server that was left over.");
  await endProcess(record.server);
}
