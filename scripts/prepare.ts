import { hashSecret, newSecret } from "@/app/_server/secret";
import { hasAccounts, replaceSetupLink } from "@/db/access/setup-links";
import type { Db } from "@/db/client";
import { findFirstSite, foundSite } from "@/db/sites/found";
import { command, withDatabase } from "./ground/connect";
import { migrateInstallation } from "./ground/ready";

/**
 * Makes the database ready for a start: schema, logins, and the first time either the demo scenario
 * or an empty site. Prints on standard output what a person needs to sign in.
 */
await command(async () => {
  const address = process.argv[2] ?? "";
  await migrateInstallation();
  await withDatabase(async (db) => {
    await foundOnce(db);
    if (!(await hasAccounts(db))) process.stdout.write(await firstAdminLink(db, address));
  });
});

async function foundOnce(db: Db): Promise<void> {
  if (await findFirstSite(db)) return;
  const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
  await foundSite(db, { name: "Our factory", timeZone });
}

async function firstAdminLink(db: Db, address: string): Promise<string> {
  const token = newSecret();
  await replaceSetupLink(db, { tokenHash: hashSecret(token), now: new Date() });
  return `Make the first admin, within 24 hours: ${address}/sign-in/first?token=${token}\n`;
}
