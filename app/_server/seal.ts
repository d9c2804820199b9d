import "server-only";
import { createHash } from "node:crypto";
import type { Scope } from "@/db/client";
import {
  addSealKey,
  findCurrentSealKey,
  findPrivateKey,
  type SealPair,
} from "@/db/kiosks/seal-keys";
import type { SealKey } from "@/lib/kiosks/schema";
import {
  fromBase64,
  readBox,
  type SealedFor,
  sealAad,
  sealInfo,
  sealSuite,
  toBase64,
} from "@/lib/kiosks/seal-format";

const held = new Map<string, SealKey>();

/** The public key that the kiosks of a site seal for; the first asking makes it. */
export async function currentSealKey(scope: Scope): Promise<SealKey> {
  const known = held.get(scope.siteId);
  if (known) return known;
  if (!(await findCurrentSealKey(scope))) await addSealKey(scope, await newPair());
  // asked again, so that two first askings agree on the newest
  const pair = await findCurrentSealKey(scope);
  if (!pair) throw new Error("a seal key was made and is not there");
  const key = { kid: pair.kid, key: pair.publicKey };
  held.set(scope.siteId, key);
  return key;
}

/** Opens a sealed PIN; null where the box is none, is for another key, or is bound to another use. */
export async function unsealPin(
  scope: Scope,
  sealed: string,
  boundTo: SealedFor,
): Promise<string | null> {
  const box = readBox(sealed);
  const privateKey = box && (await findPrivateKey(scope, box.kid));
  if (!box || !privateKey) return null;
  const recipientKey = await sealSuite.kem.importKey("raw", fromBase64(privateKey).buffer, false);
  try {
    const params = { recipientKey, enc: box.enc, info: sealInfo };
    const opened = await sealSuite.open(params, box.sealed, sealAad(boundTo));
    return new TextDecoder().decode(opened);
  } catch {
    return null; // a box that does not open proves nothing, and that is all there is to say
  }
}

/** What is kept of a sealed credential once it was verified. */
export function hashSealed(sealed: string): string {
  return createHash("sha256").update(sealed).digest("hex");
}

async function newPair(): Promise<SealPair> {
  const { kem } = sealSuite;
  const pair = await kem.generateKeyPair();
  const publicKey = new Uint8Array(await kem.serializePublicKey(pair.publicKey));
  const privateKey = new Uint8Array(await kem.serializePrivateKey(pair.privateKey));
  return {
    kid: createHash("sha256").update(publicKey).digest("hex").slice(0, 16),
    publicKey: toBase64(publicKey),
    privateKey: toBase64(privateKey),
  };
}
