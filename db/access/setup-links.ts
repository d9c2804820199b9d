import { isNull, sql } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { accounts, setupLinks } from "@/db/access/tables";
import type { Db } from "@/db/client";

/** How long the link to make the first admin can be used; a new start prints a new one. */
const LINK_MS = 24 * 3_600_000;

/** Tells whether anybody can sign in to the office yet. */
export async function hasAccounts(db: Db): Promise<boolean> {
  const [any] = await db.select({ one: sql`1` }).from(accounts).limit(1);
  return any !== undefined;
}

/** Keeps the one-time link with this SHA-256 of its token; earlier unused ones are of no use then. */
export async function replaceSetupLink(
  db: Db,
  link: { tokenHash: string; now: Date },
): Promise<void> {
  const expiresAt = new Date(link.now.getTime() + LINK_MS);
  await db.transaction(async (tx) => {
    await tx.delete(setupLinks).where(isNull(setupLinks.usedAt));
    await tx.insert(setupLinks).values({ id: uuidv7(), tokenHash: link.tokenHash, expiresAt });
  });
}
