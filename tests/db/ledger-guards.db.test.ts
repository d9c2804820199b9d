import pg from "pg";
import { describe, expect, test } from "vitest";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const SITE = "00000000-0000-4000-8000-000000000001";
const received = "2026-05-14T10:00:00.000Z";

/** Runs SQL as the app, or as the owner of every table. */
async function run(who: "app" | "owner", text: string) {
  const client = new pg.Client({ connectionString: who === "app" ? own.url : own.ownerUrl });
  await client.connect();
  try {
    return await client.query(text);
  } finally {
    await client.end();
  }
}

async function addRows() {
  await run("app", `select make_partition('clock_events', '${received}')`);
  await run(
    "app",
    `insert into clock_events (site_id, received_at, id, kind, body, body_hash)
     values ('${SITE}', '${received}', gen_random_uuid(), 'shift-start', '{}', 'x')`,
  );
  await run(
    "app",
    `insert into event_ids values ('${SITE}', gen_random_uuid(), '${received}', 'x')`,
  );
  await run("app", `insert into notes values ('${SITE}', gen_random_uuid(), 'a word', null)`);
  await run(
    "app",
    `insert into audit_log (site_id, actor, action, subject) values ('${SITE}', 'a', 'b', 'c')`,
  );
}

const forEver = ["clock_events", "event_ids", "audit_log", "notes"];
const changes = (table: string) => [
  `update ${table} set site_id = gen_random_uuid()`,
  `delete from ${table}`,
  `truncate ${table}`,
];

describe("the ledger and the audit log", () => {
  test("refuse the app every change, by right", async () => {
    await addRows();
    for (const text of [...forEver.flatMap(changes), ...changes("clock_events_2026_05")]) {
      await expect(run("app", text), text).rejects.toThrow(/permission denied/);
    }
  });

  test("refuse their owner every change, by trigger, also on a partition of its own", async () => {
    await addRows();
    for (const text of [...forEver.flatMap(changes), ...changes("clock_events_2026_05")]) {
      await expect(run("owner", text), text).rejects.toThrow(/append-only|not rewritten/);
    }
  });

  test("a note may be erased by the owner, and nothing else may happen to it", async () => {
    await addRows();
    await run("owner", "update notes set text = null, erased_at = now()");
    const { rows } = await run("owner", "select text from notes");
    expect(new Set(rows.map((row) => row.text))).toEqual(new Set([null]));
    await expect(run("owner", "update notes set text = 'other'")).rejects.toThrow(/not rewritten/);
  });
});

describe("the app's login", () => {
  test.each([
    "create table mine (a int)",
    "create schema mine",
    "alter table clock_events add column a int",
    "drop table segments",
    "alter table clock_events disable trigger all",
    "drop trigger clock_events_append_only on clock_events",
    "create or replace function refuse_change() returns trigger language sql as 'select null'",
    "alter table clock_events detach partition clock_events_2026_05",
    "select * from clock_events_2026_05",
    "set session_replication_role = replica",
  ])("may not: %s", async (text) => {
    await addRows();
    await expect(run("app", text)).rejects.toThrow(/permission denied|must be owner/);
  });

  test("owns nothing", async () => {
    const { rows } = await run(
      "app",
      `select relname from pg_class where relowner = current_user::regrole
       union all select proname from pg_proc where proowner = current_user::regrole`,
    );
    expect(rows).toEqual([]);
  });
});

describe("make_partition", () => {
  test("makes the month that holds an instant once, at both ends of it", async () => {
    const make = async (instant: string) =>
      (await run("app", `select make_partition('segments', '${instant}') as made`)).rows[0].made;
    expect(await make("2031-12-01T00:00:00Z")).toBe(true);
    expect(await make("2031-12-31T23:59:59.999Z")).toBe(false);
    expect(await make("2032-01-01T00:00:00Z")).toBe(true);
  });

  test("two at once make it once, and neither fails", async () => {
    const make = () => run("app", "select make_partition('segments', '2033-05-05')");
    await expect(Promise.all([make(), make(), make()])).resolves.toHaveLength(3);
  });

  test("makes nothing of any other table", async () => {
    const text = "select make_partition('workers', '2026-05-05')";
    await expect(run("app", text)).rejects.toThrow(/no partitions by month/);
  });
});
