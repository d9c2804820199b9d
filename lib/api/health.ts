import { z } from "zod";
import { instant } from "@/lib/ledger/schema";

/** GET /api/health: `ok` with 200, anything else with 503. */
export const health = z.object({
  status: z.enum(["ok", "unavailable"]),
  database: z.enum(["up", "down"]),
  /** How many migrations the database has and how many this version knows; null if it is down. */
  migrations: z
    .object({ applied: z.number().int().min(0), expected: z.number().int().min(0) })
    .nullable(),
  /** Marks that wait to be derived again; null if the database is down. */
  queueDepth: z.number().int().min(0).nullable(),
  /** Null where no backup was ever made. */
  lastBackupAt: instant.nullable(),
});
export type Health = z.infer<typeof health>;
