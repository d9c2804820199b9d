import { build } from "./ground/build.mjs";
import { findPrograms } from "./ground/cluster.mjs";
import {
  openInstallation,
  runningRecord,
  stopCluster,
  usesGivenServer,
} from "./ground/installation.mjs";
import { personLeaves } from "./ground/leave.mjs";
import { endLeftovers } from "./ground/leftovers.mjs";
import { installModules } from "./ground/modules.mjs";
import { installPackages } from "./ground/packages.mjs";
import { checkFolders, dataFolder, makeFolder } from "./ground/place.mjs";
import { checkNode, chooseAddress, sayPlan } from "./ground/plan.mjs";
import { identityOf, isAlive } from "./ground/process-record.mjs";
import { runScript } from "./ground/programs.mjs";
import { main, Stop, say } from "./ground/say.mjs";
import { localAddress } from "./ground/server.mjs";
import { serve } from "./ground/supervise.mjs";

const REACHABLE =
  "Others on the network can reach it, by plain http: put TLS in front (README), and leave demo\n" +
  "sign-ins open to nobody who should not have them.";

/** `npm start`: from a fresh clone to a served Bookmatch, and from there to the next Ctrl-C. */
await main(async () => {
  checkNode();
  checkFolders();
  makeFolder(dataFolder());
  const record = runningRecord();
  const before = record.read();
  if (isAlive(before?.supervisor)) return sayRunning(before);
  const leaving = personLeaves("SIGTERM");
  await endLeftovers(before);
  const { host, port } = await chooseAddress();
  sayPlan({ host, port });
  record.write({ supervisor: identityOf(process.pid), server: null, address: null });
  try {
    await startAndStay({ host, port, record, leaving });
  } catch (error) {
    if (!leaving.isOver) throw error; // what was interrupted on purpose needs no reason
  } finally {
    await stopCluster();
    record.remove();
  }
  say("Bookmatch is stopped.");
});

async function startAndStay({ host, port, record, leaving }) {
  if (!usesGivenServer && !findPrograms())
    await installPackages(
      ["postgresql"],
      "give the address of a PostgreSQL server in DATABASE_URL.",
    );
  await installModules();
  await build();
  if (leaving.isOver) return;
  const installation = await openInstallation();
  const greeting = await prepare(installation.env, localAddress(host, port));
  if (leaving.isOver) return;
  const server = await serve({ installation, host, port, record, leaving: leaving.promise });
  record.write({ address: server.address, greeting });
  if (!leaving.isOver) say(`\nBookmatch is running: ${server.address}\n${greeting}`);
  if (!leaving.isOver && !/^(127\.|::1$|localhost$)/.test(host)) say(REACHABLE);
  if (!leaving.isOver) say("Stop it with Ctrl-C or npm stop.");
  await server.watch().finally(() => server.stop());
}

/** Migrates, loads the demo the first time, and gives what a person needs to sign in. */
async function prepare(env, address) {
  const { code, text } = await runScript("prepare.ts", [address], env, {
    mayFail: true,
    talk: true,
  });
  if (code !== 0) throw new Stop("The database could not be made ready; the reason stands above.");
  return text.trim();
}

function sayRunning({ supervisor, address, greeting }) {
  if (address) say(`Bookmatch is already running: ${address}\n${greeting}\nStop it with npm stop.`);
  else say(`Bookmatch is already being started, by process ${supervisor.pid}.`);
}
