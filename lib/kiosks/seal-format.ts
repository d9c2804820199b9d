import { Aes128Gcm, CipherSuite, HkdfSha256 } from "@hpke/core";
import { DhkemX25519HkdfSha256 } from "@hpke/dhkem-x25519";

/** What a sealed credential is bound to: it opens for nothing else. */
export interface SealedFor {
  siteId: string;
  kioskId: string;
  /** The worker's number. */
  worker: string;
  session: string;
}

/** The parts of a box: which key it was sealed for, the encapsulated key, the sealed bytes. */
export interface Box {
  kid: string;
  enc: Uint8Array;
  sealed: Uint8Array;
}

/** The encapsulated key of X25519 is 32 bytes (RFC 9180 section 7.1). */
const ENC_BYTES = 32;
const BOX = /^v1\.([\w-]{1,64})\.([A-Za-z0-9+/]+={0,2})$/;

/** HPKE in base mode: DHKEM(X25519, HKDF-SHA256), HKDF-SHA256, AES-128-GCM (RFC 9180). */
export const sealSuite = new CipherSuite({
  kem: new DhkemX25519HkdfSha256(),
  kdf: new HkdfSha256(),
  aead: new Aes128Gcm(),
});

/** The application's info of RFC 9180: a key used for anything else opens no credential. */
export const sealInfo = new TextEncoder().encode("bookmatch credential v1");

/** The additional data that a box is bound to: site, kiosk, worker and session. */
export function sealAad({ siteId, kioskId, worker, session }: SealedFor): Uint8Array {
  return new TextEncoder().encode(JSON.stringify([siteId, kioskId, worker, session]));
}

/** Writes a box as `v1.<kid>.<base64>`: the encapsulated key, then the sealed bytes. */
export function writeBox({ kid, enc, sealed }: Box): string {
  return `v1.${kid}.${toBase64(new Uint8Array([...enc, ...sealed]))}`;
}

/** Reads a box; null where the text is none. */
export function readBox(text: string): Box | null {
  const match = BOX.exec(text);
  if (!match?.[1] || !match[2] || match[2].length % 4 !== 0) return null;
  const bytes = fromBase64(match[2]);
  if (bytes.length <= ENC_BYTES) return null;
  return { kid: match[1], enc: bytes.slice(0, ENC_BYTES), sealed: bytes.slice(ENC_BYTES) };
}

/** Seals a PIN for the server alone; `key` is the server's public key in base64. */
export async function sealPin(
  pin: string,
  { kid, key }: { kid: string; key: string },
  boundTo: SealedFor,
): Promise<string> {
  const recipientPublicKey = await sealSuite.kem.deserializePublicKey(fromBase64(key));
  const sender = await sealSuite.createSenderContext({ recipientPublicKey, info: sealInfo });
  const sealed = await sender.seal(new TextEncoder().encode(pin), sealAad(boundTo));
  return writeBox({ kid, enc: new Uint8Array(sender.enc), sealed: new Uint8Array(sealed) });
}

/** Writes bytes as base64 (RFC 4648 section 4). */
export function toBase64(bytes: Uint8Array): string {
  return btoa(String.fromCharCode(...bytes));
}

/** Reads base64 (RFC 4648 section 4) that is known to be well formed. */
export function fromBase64(text: string): Uint8Array<ArrayBuffer> {
  return Uint8Array.from(atob(text), (character) => character.charCodeAt(0));
}
