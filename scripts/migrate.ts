import { command, say } from "./ground/connect";
import { migrateInstallation } from "./ground/ready";

/** `npm run db:migrate`: brings the installation's database to this code's schema. */
await command(async () => {
  await migrateInstallation();
  say("The database has this code's schema.");
});
