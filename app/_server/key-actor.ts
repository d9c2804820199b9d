import "server-only";
import type { KeyActor } from "@/app/_server/actor";
import { bearerOf } from "@/app/_server/bearer";
import { database } from "@/app/_server/database";
import { hashSecret } from "@/app/_server/secret";
import { findKey } from "@/db/access/queries";
import { no, ok, type Result } from "@/lib/result";

/** What every integration key begins with, so that a leaked one is recognised. */
export const KEY_PREFIX = "bm_";

/** Finds the integration key of a request; unknown, revoked and missing ones get the same words. */
export async function keyOf(request: Request): Promise<Result<KeyActor>> {
  const secret = bearerOf(request);
  const key = secret?.startsWith(KEY_PREFIX) ? await findKey(database(), hashSecret(secret)) : null;
  if (!key) {
    return no("unauthenticated", "Send a valid key as `Authorization: Bearer bm_…`.");
  }
  return ok({
    kind: "key",
    siteId: key.siteId,
    keyId: key.id,
    held: [{ role: key.role, cells: [] }],
  });
}
