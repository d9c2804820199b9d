import { setTimeout } from "node:timers/promises";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { log } from "@/app/_server/log";
import { countDirtyMarks } from "@/db/jobs/queries";
import { findSchemaVersion } from "@/db/schema-version";
import type { Health } from "@/lib/api/schema";
import { ok } from "@/lib/result";

/** A database that takes longer than this to say a word is no use to anyone at a bench. */
const PATIENCE_MS = 3000;

const down: Health = {
  status: "unavailable",
  database: "down",
  migrations: null,
  queueDepth: null,
  lastBackupAt: null,
};

/** Says whether the installation can work: 200 if so, 503 if the database is away or not migrated. */
export const GET = handle({ actor: "nobody" }, async () => {
  const seen = await Promise.race([look(), setTimeout(PATIENCE_MS, null, { ref: false })]).catch(
    (error: unknown) => {
      log().warn({ err: error }, "the database does not answer");
      return null;
    },
  );
  if (seen?.status === "ok") return ok(seen);
  return Response.json(seen ?? down, { status: 503, headers: { "cache-control": "no-store" } });
});

async function look(): Promise<Health> {
  const db = database();
  const [schema, queueDepth] = await Promise.all([findSchemaVersion(db), countDirtyMarks(db)]);
  // a schema that this code has no name for is newer and serves it, or the start had refused it
  const isCurrent = schema !== null && (schema.isOwn || schema.name === null);
  return {
    status: isCurrent ? "ok" : "unavailable",
    database: "up",
    migrations: { applied: schema?.name ?? null, isCurrent },
    queueDepth,
    lastBackupAt: null,
  };
}
