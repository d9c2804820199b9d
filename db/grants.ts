import "server-only";
import type pg from "pg";

/** Whoever may do what the app does: logins are members, so that the rights are granted once. */
export const APP_GROUP = "bookmatch_app";

/** What may be added to and read, and nothing else: the ledger and what proves it (LEDGER.md 1). */
const appendOnly = [
  "clock_events",
  "event_ids",
  "notes",
  "audit_log",
  "pay_policies",
  "pay_choices",
  "pay_rhythms",
  "pay_revisions",
  "pay_reopenings",
  "pay_cards",
  "pay_rows",
];

/** Roles belong to the whole server, so another database on it may have made the group already. */
export async function makeAppGroup(client: pg.ClientBase): Promise<void> {
  await client.query(`do $$ begin
    create role ${APP_GROUP} nologin;
  exception when duplicate_object or unique_violation then null;
  end $$`);
}

/** Gives the app's group exactly its rights on the schema as it is now; partitions go by parents. */
export async function grantToApp(client: pg.ClientBase): Promise<void> {
  const { rows } = await client.query<{ name: string; isPartition: boolean }>(`
    select format('%I.%I', n.nspname, c.relname) as name, c.relispartition as "isPartition"
    from pg_class c
    join pg_namespace n on n.oid = c.relnamespace
    where n.nspname = 'public' and c.relkind in ('r', 'p')`);
  for (const { name, isPartition } of rows) {
    await client.query(`revoke all on ${name} from ${APP_GROUP}`);
    if (!isPartition) await client.query(`grant ${rightsOn(name)} on ${name} to ${APP_GROUP}`);
  }
  await client.query(`grant usage on schema public, drizzle to ${APP_GROUP}`);
  await client.query(`grant select on all tables in schema drizzle to ${APP_GROUP}`);
}

function rightsOn(name: string): string {
  const isAppendOnly = appendOnly.includes(name.replace("public.", ""));
  return isAppendOnly ? "select, insert" : "select, insert, update, delete";
}
