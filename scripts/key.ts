import { KEY_PREFIX } from "@/app/_server/key-actor";
import { hashSecret, newSecret } from "@/app/_server/secret";
import { addKey } from "@/db/access/keys";
import { role, roles } from "@/lib/access/roles";
import { command, Refusal, readOptions, say, withSite } from "./ground/connect";

/** `npm run key -- --role planner [--name "Order import"]`: prints a new integration key, once. */
await command(async () => {
  const usage = `npm run key -- --role ${roles.join("|")}`;
  const values = readOptions({ role: { type: "string" }, name: { type: "string" } }, usage);
  const wanted = role.safeParse(values.role);
  if (!wanted.success) throw new Refusal(`Say for whom: ${usage}`);
  const secret = `${KEY_PREFIX}${newSecret()}`;
  const name = values.name ?? `${wanted.data}, by command`;
  const key = { keyHash: hashSecret(secret), role: wanted.data, name, by: "command:key" };
  await withSite((scope) => addKey(scope, key));
  process.stdout.write(`${secret}\n`);
  say(`A key with the role ${wanted.data}. It is shown this once; only its digest is kept.`);
});
