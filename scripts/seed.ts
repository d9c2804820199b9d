import { command, withDatabase } from "./ground/connect";
import { loadWithProgress } from "./ground/demo";
import { migrateInstallation } from "./ground/ready";

/** `npm run seed`: loads the demo scenario into an installation that has no site yet. */
await command(async () => {
  await migrateInstallation();
  await withDatabase(loadWithProgress);
});
