import { env } from "@/app/_server/env";
import { hashSecret, newSecret } from "@/app/_server/secret";
import { hasAccounts, replaceSetupLink } from "@/db/access/setup-links";
import type { Db } from "@/db/client";
import { makePartitions } from "@/db/jobs/commands";
import { findDemoSignIns } from "@/db/seed/sign-ins";
import { findFirstSite, foundSite } from "@/db/sites/found";
import { command, withDatabase } from "./ground/connect";
import { loadWithProgress, readable } from "./ground/demo";
import { migrateInstallation } from "./ground/ready";

/**
 * Makes the database ready for a start: schema, logins, and the first time either the demo scenario
 * or an empty site. Prints on standard output what a person needs to sign in.
 */
await command(async () => {
  const address = process.argv[2] ?? "";
  await migrateInstallation();
  await withDatabase(async (db) => {
    await makePartitions(db, new Date());
    if (!(await findFirstSite(db))) await found(db);
    process.stdout.write(await greeting(db, address));
  });
});

async function found(db: Db): Promise<void> {
  if (env().BOOKMATCH_DEMO === "1") return loadWithProgress(db);
  const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
  await foundSite(db, { name: "Our factory", timeZone });
}

async function greeting(db: Db, address: string): Promise<string> {
  if (!(await hasAccounts(db))) return firstAdminLink(db, address);
  const signIns = env().BOOKMATCH_DEMO === "1" ? await findDemoSignIns(db) : null;
  return signIns ? readable(signIns, false) : `Sign in: ${address}/sign-in`;
}

async function firstAdminLink(db: Db, address: string): Promise<string> {
  const token = newSecret();
  await replaceSetupLink(db, { tokenHash: hashSecret(token), now: new Date() });
  return `Make the first admin, within 24 hours: ${address}/sign-in/first?token=${token}`;
}
