import "server-only";
import { hash, verify } from "@node-rs/argon2";
import { spelledPassword } from "@/lib/access/password";

/** OWASP Password Storage Cheat Sheet: Argon2id, 19 MiB, two passes, one lane at the least. */
const ARGON2 = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Hashes a password with Argon2id and a salt of its own. */
export function hashPassword(password: string): Promise<string> {
  return hash(spelledPassword(password), ARGON2);
}

let nobody: Promise<string> | undefined;

/**
 * Says whether the password belongs to `passwordHash`. Without a hash (no such account) it works as
 * long on one that nothing opens, so that the answer's time tells nothing.
 */
export async function provesPassword(passwordHash: string | null, password: string) {
  nobody ??= hashPassword("no account has this one");
  const proved = await verify(passwordHash ?? (await nobody), spelledPassword(password));
  return proved && passwordHash !== null;
}
