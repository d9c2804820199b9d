import "server-only";
import pg from "pg";
import { APP_GROUP } from "@/db/grants";
import { no, ok, type Result } from "@/lib/result";

/**
 * Sees to it that the login of the app's address has the app's rights and no others.
 *
 * @param ownerUrl a login that owns the database
 * @param app `isOurs`: made and renewed by us; else a person made it, and it is only let in
 */
export async function admitApp(
  ownerUrl: string,
  app: { url: string; isOurs: boolean },
): Promise<Result<null>> {
  const { username, password } = new URL(app.url);
  const login = decodeURIComponent(username);
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    if (!app.isOurs) return await admitLogin(client, login);
    await giveAppLogin(client, { login, password: decodeURIComponent(password) });
    return ok(null);
  } finally {
    await client.end();
  }
}

async function admitLogin(client: pg.Client, login: string): Promise<Result<null>> {
  const { rows } = await client.query<{ hasPower: boolean; isMember: boolean }>(
    `select rolsuper or rolcreaterole or rolbypassrls as "hasPower",
       pg_has_role(rolname, $2, 'member') as "isMember"
     from pg_roles where rolname = $1`,
    [login, APP_GROUP],
  );
  const found = rows[0];
  if (!found) return no("notFound", `The server has no login ${login}, which DATABASE_URL names.`);
  if (found.hasPower)
    return no("forbidden", `${login} has power over the server. Give the app a plain login.`);
  if (!found.isMember)
    await client.query(`grant ${APP_GROUP} to ${client.escapeIdentifier(login)}`);
  return ok(null);
}

/**
 * Makes or renews the login with which the app works: a member of the group, owner of nothing.
 *
 * @param login a plain lower-case name; it goes into SQL as an identifier
 */
export async function giveAppLogin(
  client: pg.ClientBase,
  { login, password }: { login: string; password: string },
): Promise<void> {
  const name = client.escapeIdentifier(login);
  const secret = client.escapeLiteral(password);
  await client.query(`do $$ begin
    create role ${name} login nosuperuser nocreatedb nocreaterole;
  exception when duplicate_object or unique_violation then null;
  end $$`);
  await client.query(`alter role ${name} password ${secret}`);
  await client.query(`grant ${APP_GROUP} to ${name}`);
  const { rows } = await client.query<{ name: string }>(
    "select quote_ident(current_database()) as name",
  );
  await client.query(`revoke all on database ${rows[0]?.name} from public`);
  await client.query(`grant connect on database ${rows[0]?.name} to ${name}`);
}
