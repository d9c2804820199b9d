import { timestamp, uuid } from "drizzle-orm/pg-core";

/** The first half of every key: rows of two sites never meet (LEDGER.md 11). */
export const siteId = () => uuid().notNull();
/** The second half of every key: a UUIDv7 made by whoever makes the row. */
export const id = () => uuid().notNull();
/** An instant to the millisecond, in UTC. */
export const instantAt = () => timestamp({ withTimezone: true, precision: 3, mode: "date" });
