import { spawn } from "node:child_process";
import { once } from "node:events";
import { readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import type { SQL } from "drizzle-orm";
import { PgDialect } from "drizzle-orm/pg-core";
import pg from "pg";
import { hashSecret } from "@/app/_server/secret";
import type { Db } from "@/db/client";
import { bookEvents } from "@/db/ledger/commands";
import type { ClockEvent } from "@/lib/ledger/schema";
import { CONNECTIONS, type Run } from "@/tests/bench/drive";
import type { BenchWorker } from "@/tests/bench/state";

/** The statements with which the server books one event, with their values. */
interface Recorded {
  tokenHash: string;
  read: { text: string; values: unknown[] };
  write: { text: string; values: unknown[] };
}

/**
 * Records, without writing, what the server would ask the database for each event: who the tablet
 * is, the context, and the booking decided on it.
 */
export async function recordStatements(
  db: Db,
  siteId: string,
  taps: readonly { worker: BenchWorker; event: ClockEvent }[],
): Promise<Recorded[]> {
  const dialect = new PgDialect({ casing: "snake_case" });
  const recorded: Recorded[] = [];
  for (const { worker, event } of taps) {
    const asked: { text: string; values: unknown[] }[] = [];
    const listening: Db = Object.create(db);
    listening.execute = ((query: SQL) => {
      const { sql: text, params } = dialect.sqlToQuery(query);
      asked.push({ text, values: params });
      return text.startsWith("select book(") ? Promise.resolve({ rows: [] }) : db.execute(query);
      // safe because the caller reads the rows of the first statement only
    }) as unknown as Db["execute"];
    const batch = {
      kioskId: worker.kioskId,
      events: [event],
      receivedAt: new Date(),
      withBench: true,
    };
    await bookEvents({ db: listening, siteId }, batch);
    const [read, write] = asked;
    if (!read || !write || asked.length !== 2)
      throw new Error(`booking one event took ${asked.length} statements`);
    const tokenHash = hashSecret(worker.cookie.split("=")[1]!);
    recorded.push({ tokenHash, read, write });
  }
  return recorded;
}

/** Types of the values of both statements, as the server learns them from its functions. */
const READ =
  "uuid, uuid[], text[], uuid[], uuid[], text[], timestamptz[], uuid[], text[], text[], int, timestamptz, uuid[]";
const WRITE = "uuid, jsonb";

/** Keeps what was recorded in a table of the database, one row an event, for pgbench to replay. */
export async function keepStatements(
  ownerUrl: string,
  recorded: readonly Recorded[],
): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query(tableOf([...typed("r", READ), ...typed("w", WRITE)]));
    await client.query("grant select on bench_calls to bookmatch_app");
    for (const [n, { tokenHash, read, write }] of recorded.entries()) {
      const values = [n, tokenHash, ...read.values, ...write.values];
      const places = values.map((_, at) => `$${at + 1}`).join(", ");
      await client.query(`insert into bench_calls values (${places})`, values);
    }
    await client.query("analyze bench_calls");
  } finally {
    await client.end();
  }
}

function tableOf(columns: readonly string[]): string {
  return `create table bench_calls (n int primary key, token_hash text, ${columns.join(", ")})`;
}

/** Names a statement's values as columns, in their order: `r1 uuid`, `r2 uuid` and so on. */
function typed(prefix: string, types: string): string[] {
  return types.split(", ").map((type, at) => `${prefix}${at + 1} ${type}`);
}

/** Replays each recorded booking once through pgbench, as many at a time as tablets hand in. */
export async function replay(
  url: string,
  {
    recorded,
    programs,
    folder,
  }: { recorded: readonly Recorded[]; programs: string; folder: string },
): Promise<Run> {
  const script = path.join(folder, "book.sql");
  writeFileSync(script, scriptOf(recorded[0]!));
  const transactions = Math.floor(recorded.length / CONNECTIONS);
  const clients = ["-c", String(CONNECTIONS), "-j", "1", "-t", String(transactions)];
  const log = path.join(folder, "pgbench");
  const how = ["-n", "-M", "extended", "-D", "turn=0", "-l", `--log-prefix=${log}`, "-f", script];
  const child = spawn(path.join(programs, "pgbench"), [...how, ...clients, url], { cwd: folder });
  let text = "";
  child.stdout.on("data", (chunk) => {
    text += chunk;
  });
  child.stderr.on("data", (chunk) => {
    text += chunk;
  });
  const [code] = await once(child, "exit");
  const perSecond = Number(/^tps = ([\d.]+)/m.exec(text)?.[1]);
  if (code !== 0 || !(perSecond > 0)) throw new Error(text);
  return { perSecond, ...latencies(`${log}.${child.pid}`) };
}

/** The same functions with the same values; the tablet's row is found first, as by the server. */
function scriptOf({ read, write }: Recorded): string {
  const from = "from bench_calls where n = :n";
  return [
    "\\set n :turn * 16 + :client_id",
    "\\set turn :turn + 1",
    `select k.site_id, k.id, k.revoked_at from kiosks k
      where k.token_hash = (select token_hash ${from}) limit 1;`,
    `${withColumns(read.text, "r")} ${from};`,
    `${withColumns(write.text, "w")} ${from};`,
  ].join("\n");
}

/** Puts the table's columns in the places of a statement's values. */
function withColumns(text: string, prefix: string): string {
  return text.replace(/\$(\d+)/g, (_, place) => `${prefix}${place}`);
}

/** Reads pgbench's log of single transactions; its third column is how long one took, in µs. */
function latencies(log: string): Pick<Run, "p50" | "p99"> {
  const lines = readFileSync(log, "utf8").trim().split("\n");
  const ms = lines.map((line) => Number(line.split(" ")[2]) / 1000).sort((a, b) => a - b);
  const at = (share: number) => ms[Math.min(ms.length - 1, Math.floor(ms.length * share))] ?? 0;
  return { p50: at(0.5), p99: at(0.99) };
}
