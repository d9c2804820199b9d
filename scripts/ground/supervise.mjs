import path from "node:path";
import { dataFolder } from "./place.mjs";
import { identityOf } from "./process-record.mjs";
import { atMost } from "./run.mjs";
import { Stop, say } from "./say.mjs";
import { localAddress, startServer, tailOf, waitForHealth } from "./server.mjs";

/** How often the database server is looked at. */
const LOOK_MS = 2_000;
/** A server that ends this often within a minute has a reason that starting again does not cure. */
const RESTARTS_A_MINUTE = 5;

/**
 * Keeps the web server and the installation's cluster up until `leaving` resolves: one that was
 * killed is started again. Gives a function that stops the web server.
 *
 * @param {{installation: object, host: string, port: number, record: object, leaving: Promise<void>}} how
 */
export async function serve({ installation, host, port, record, leaving }) {
  const logFile = path.join(dataFolder(), "server.log");
  const begin = () => {
    const started = startServer({ env: installation.env, host, port, logFile });
    record.write({ server: identityOf(started.pid) });
    return started;
  };
  let server = begin();
  const address = localAddress(host, port);
  const isUp = await Promise.race([waitForHealth(address, server.ended), leaving.then(() => true)]);
  if (!isUp) {
    await server.stop();
    throw new Stop(`The server did not come up. The end of ${logFile}:\n${tailOf(logFile)}`);
  }
  return { address, stop: () => server.stop(), watch };

  /** Ends when the person leaves, or with a reason when the server cannot be kept up. */
  async function watch() {
    const ends = [];
    let isLeaving = false;
    leaving.then(() => {
      isLeaving = true;
    });
    while (!isLeaving) {
      const end = await atMost(LOOK_MS, Promise.race([server.ended, leaving]));
      if (isLeaving) return;
      await reviveCluster();
      if (!end) continue;
      ends.push(Date.now());
      if (ends.filter((at) => at > Date.now() - 60_000).length > RESTARTS_A_MINUTE)
        throw new Stop(`The server keeps ending (${end}). The end of its log:\n${tailOf(logFile)}`);
      say(`The web server ended (${end}): starting it again.`);
      server = begin();
    }
  }

  async function reviveCluster() {
    const { cluster } = installation;
    if (!cluster || cluster.looksAlive()) return;
    say("The database server ended: starting it again.");
    await cluster.start().then(
      () => say("The database server is back."),
      (error) => say(`It did not start, trying again: ${error.message}`),
    );
  }
}
