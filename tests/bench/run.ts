import { cpus, loadavg, totalmem } from "node:os";
import { openPool, wrap } from "@/db/client";
import { benchAnalytics } from "@/tests/bench/analytics";
import { benchClose } from "@/tests/bench/close";
import { fire, type Run } from "@/tests/bench/drive";
import { FOLDER, given, onClone, onServer, STATE } from "@/tests/bench/ground";
import { reportOf } from "@/tests/bench/report";
import { batches, empties, nextTap, signIns, singles } from "@/tests/bench/shots";
import { makeState, type State } from "@/tests/bench/state";
import { keepStatements, recordStatements, replay } from "@/tests/bench/statements";
import { kioskWeight } from "@/tests/bench/weight";
import { APP, ask, cloneDatabase, OWNER, urlFor } from "@/tests/setup/clone";
import { makeTemplate } from "@/tests/setup/template";

const server = given("BENCH_SERVER");
const loadBefore = loadavg();
const BATCHES = 200;
const SIGN_INS = 400;
/** As many taps, as many a second, as a large floor makes in its busiest minute. */
const STEADY = 1500;
const STEADY_RATE = 50;
/** People whose taps warm the server up; the others' are measured. */
const WARM_UP = 200;

const state = await stateOfMorning();
const warm = state.workers.slice(0, WARM_UP);
const people = state.workers.slice(WARM_UP);

say("one event a request, beside an empty route");
const { single, empty, steady } = await onServer(async (url) => {
  await fire(url, empties(1000), { status: 401 });
  const floor = await fire(url, empties(6000), { status: 401 });
  await fire(url, singles(state, warm));
  const [calm, busy] = [people.slice(0, STEADY), people.slice(STEADY)];
  const paced = await fire(url, singles(state, calm), { rate: STEADY_RATE });
  return { empty: floor, steady: paced, single: await fire(url, singles(state, busy)) };
});
tell(empty);
tell(steady);
tell(single);
say("batches");
const batched = await onServer(async (url) => {
  await fire(url, singles(state, warm));
  return fire(url, batches(state, people, BATCHES));
});
tell(batched);
say("sign-ins");
const signedIn = await onServer(async (url) => {
  // spread over the tablets: many at once on a single one would be slowed down as guesses
  const [first = [], ...others] = turns(people, 50);
  await fire(url, signIns(first));
  return fire(url, signIns(others.flat().slice(0, SIGN_INS)));
});
tell(signedIn);
say("the same statements through pgbench");
const replayed = await onClone(replayBookings);
const measured = { empty, single, steady, batched, signedIn, replayed };
process.stdout.write(`\n${await machine()}\n${reportOf(measured)}`);
process.stdout.write(`\n${kioskWeight()}`);
process.stdout.write(`\n${await benchAnalytics(server, say)}`);
process.stdout.write(`\n${await benchClose(server, say)}`);

/** What it was measured on, and how busy that was with other things as well. */
async function machine(): Promise<string> {
  const [{ model } = { model: "unknown" }, ...others] = cpus();
  const { rows } = await ask(server, "select current_setting('server_version') as version");
  const gigabytes = (totalmem() / 2 ** 30).toFixed(1);
  const load = [loadBefore, loadavg()].map(([minute = 0]) => minute.toFixed(1)).join(" to ");
  return [
    `${others.length + 1} × ${model}, ${gigabytes} GB; load ${load} from first to last`,
    `Node.js ${process.version}, PostgreSQL ${rows[0]?.version}`,
  ].join("\n");
}

/** Deals people out so that neighbours come from different tablets: `step` people share one. */
function turns<T>(all: readonly T[], step: number): T[][] {
  return Array.from({ length: step }, (_, turn) => all.filter((_each, at) => at % step === turn));
}

async function stateOfMorning(): Promise<State> {
  await ask(server, `drop database if exists ${STATE} with (force)`);
  await cloneDatabase(server, await makeTemplate(server), STATE);
  const pool = openPool(urlFor(server, APP, STATE), hear);
  say("booking a morning of 4,000 people");
  const made = await makeState(wrap(pool)).finally(() => pool.end());
  // what autovacuum would have done in the course of the morning
  await ask(server, "vacuum analyze", [], STATE);
  return made;
}

async function replayBookings(name: string) {
  const pool = openPool(urlFor(server, APP, name), hear);
  const taps = people.map((worker) => ({ worker, event: nextTap(state, worker) }));
  const recorded = await recordStatements(wrap(pool), state.siteId, taps);
  await pool.end();
  await keepStatements(urlFor(server, OWNER, name), recorded);
  await ask(server, "checkpoint");
  const programs = given("BENCH_PROGRAMS");
  return replay(urlFor(server, APP, name), { recorded, programs, folder: FOLDER });
}

function tell({ perSecond }: Run): void {
  say(`   ${perSecond.toFixed(1)} requests/s`);
}

function say(text: string): void {
  process.stderr.write(`── ${text}\n`);
}

/** An idle connection that breaks spoils no measurement; a query on it would fail by itself. */
function hear(error: Error): void {
  say(error.message);
}
