import { type ParseArgsConfig, parseArgs } from "node:util";
import { env } from "@/app/_server/env";
import { type Db, openPool, type Scope, wrap } from "@/db/client";
import { findFirstSite } from "@/db/sites/found";

type Options = NonNullable<ParseArgsConfig["options"]>;

/** What a person is told instead of a stack. */
export class Refusal extends Error {}

/** Speaks to the person on standard error; standard output is for the answer. */
export function say(text: string): void {
  process.stderr.write(`${text}\n`);
}

/** Runs a command; a refusal is printed plainly, anything else with its stack. */
export async function command(work: () => Promise<void>): Promise<void> {
  try {
    await work();
  } catch (error) {
    const reason = error instanceof Refusal ? error.message : whyNoDatabase(error);
    if (!reason) throw error;
    say(reason);
    process.exitCode = 1;
  }
}

/** PostgreSQL's and the network's codes for: wrong password, no such login, no such database, … */
const NO_WAY_IN =
  /^(28P01|28000|3D000|57P03|ECONNREFUSED|ENOTFOUND|EAI_AGAIN|E[A-Z]+UNREACH|ETIMEDOUT)$/;

/** Says in plain words why a database server was not reached; null for any other fault. */
export function whyNoDatabase(error: unknown): string | null {
  if (!(error instanceof Error) || !("code" in error)) return null;
  if (!NO_WAY_IN.test(String(error.code))) return null;
  return `The database server cannot be used: ${error.message || String(error.code)}. If it is one of your own, look at DATABASE_URL.`;
}

/** Reads the command's options; what it does not know is refused with how to call it. */
export function readOptions<const T extends Options>(options: T, usage: string) {
  try {
    return parseArgs({ options }).values;
  } catch (error) {
    const [what] = String((error as Error).message).split(". ");
    throw new Refusal(`${what}. Say: ${usage}`);
  }
}

/** Works with the app's login and closes the connections after it. */
export async function withDatabase<T>(work: (db: Db) => Promise<T>): Promise<T> {
  const pool = openPool(env().DATABASE_URL, (error) => say(error.message), 4);
  return work(wrap(pool)).finally(() => pool.end());
}

/** The same, within the installation's site. */
export async function withSite<T>(work: (scope: Scope) => Promise<T>): Promise<T> {
  return withDatabase(async (db) => {
    const site = await findFirstSite(db);
    if (!site) throw new Refusal("There is no site here yet. Start Bookmatch once: npm start");
    return work({ db, siteId: site.id });
  });
}
