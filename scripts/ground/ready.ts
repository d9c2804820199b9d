import { z } from "zod";
import { admitApp } from "@/db/logins";
import { migrate } from "@/db/migrate";
import { Refusal } from "./connect";

/** What the start command says of the database to the programs that it runs. */
const given = z.object({
  DATABASE_OWNER_URL: z.url(),
  DATABASE_URL: z.url(),
  /** "1": the app's login is ours to make; "0": a person made it. */
  BOOKMATCH_MAKE_LOGIN: z.enum(["0", "1"]).default("0"),
});

/** Migrates as the owner, and lets the app's login in. */
export async function migrateInstallation(): Promise<void> {
  const { DATABASE_OWNER_URL, DATABASE_URL, BOOKMATCH_MAKE_LOGIN } = given.parse(process.env);
  const isOurs = BOOKMATCH_MAKE_LOGIN === "1";
  const migrated = await migrate(DATABASE_OWNER_URL);
  if (!migrated.ok) throw new Refusal(migrated.problem.detail);
  const admitted = await admitApp(DATABASE_OWNER_URL, { url: DATABASE_URL, isOurs });
  if (!admitted.ok) throw new Refusal(admitted.problem.detail);
}
