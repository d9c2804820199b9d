import "server-only";
import { createHash, randomBytes, randomInt } from "node:crypto";

/** Makes a secret of 256 random bits, as text that fits a cookie, a header and a URL. */
export function newSecret(): string {
  return randomBytes(32).toString("base64url");
}

/** The form in which a random secret is stored: SHA-256 is enough for 256 random bits. */
export function hashSecret(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}

/** Draws a random integer from 0 up to, not including, `below`, for PINs, passwords and codes. */
export function drawSecret(below: number): number {
  return randomInt(below);
}
