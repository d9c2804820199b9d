import { and, desc, eq, isNull } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Scope } from "@/db/client";
import { sealKeys } from "@/db/kiosks/tables";

/** A key pair with which kiosks seal credentials, both halves in base64. */
export interface SealPair {
  kid: string;
  publicKey: string;
  privateKey: string;
}

/** Finds the key pair that kiosks shall seal for now; null before the first one was made. */
export async function findCurrentSealKey({ db, siteId }: Scope): Promise<SealPair | null> {
  const [pair] = await db
    .select({
      kid: sealKeys.kid,
      publicKey: sealKeys.publicKey,
      privateKey: sealKeys.privateKey,
    })
    .from(sealKeys)
    .where(and(eq(sealKeys.siteId, siteId), isNull(sealKeys.retiredAt)))
    .orderBy(desc(sealKeys.createdAt), desc(sealKeys.id))
    .limit(1);
  return pair ?? null;
}

/** Finds the private half of a key by its id, retired or not: old boxes must still open. */
export async function findPrivateKey({ db, siteId }: Scope, kid: string): Promise<string | null> {
  const [pair] = await db
    .select({ privateKey: sealKeys.privateKey })
    .from(sealKeys)
    .where(and(eq(sealKeys.siteId, siteId), eq(sealKeys.kid, kid)))
    .limit(1);
  return pair?.privateKey ?? null;
}

/** Keeps a new key pair; the newest is the current one. */
export async function addSealKey({ db, siteId }: Scope, pair: SealPair): Promise<void> {
  await db.insert(sealKeys).values({ siteId, id: uuidv7(), ...pair });
}
