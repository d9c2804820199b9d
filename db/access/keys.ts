import { v7 as uuidv7 } from "uuid";
import { apiKeys } from "@/db/access/tables";
import { recordAct } from "@/db/audit/commands";
import type { Scope } from "@/db/client";
import type { Role } from "@/lib/access/roles";

/** Keeps a new integration key by the SHA-256 of its secret; gives its id. */
export async function addKey(
  { db, siteId }: Scope,
  key: { keyHash: string; role: Role; name: string; by: string },
): Promise<string> {
  const { keyHash, role, name, by } = key;
  const id = uuidv7();
  await db.transaction(async (tx) => {
    await tx.insert(apiKeys).values({ id, siteId, role, name, keyHash });
    const entry = { by, action: "keys.add", subject: `key:${id}`, detail: { role, name } };
    await recordAct({ db: tx, siteId }, entry);
  });
  return id;
}
