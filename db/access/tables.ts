import { sql } from "drizzle-orm";
import {
  check,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { cells } from "@/db/cells/tables";
import { id, instantAt, siteId } from "@/db/columns";
import { workers } from "@/db/people/tables";
import { sites } from "@/db/sites/tables";
import { roles } from "@/lib/access/roles";

const isRole = (column: unknown) =>
  sql`${column} in (${sql.raw(roles.map((role) => `'${role}'`).join(", "))})`;

/** A sign-in for the office, above all sites. */
export const accounts = pgTable("accounts", {
  id: uuid().primaryKey(),
  email: text().notNull().unique(),
  name: text().notNull(),
  passwordHash: text().notNull(),
  disabledAt: instantAt(),
  createdAt: instantAt().notNull().defaultNow(),
});

/** A role that an account holds at a site; a lead has one row per cell. */
export const accountRoles = pgTable(
  "account_roles",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    accountId: uuid()
      .notNull()
      .references(() => accounts.id),
    role: text({ enum: roles as [string, ...string[]] }).notNull(),
    cellId: uuid(),
    createdAt: instantAt().notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    unique().on(t.siteId, t.accountId, t.role, t.cellId).nullsNotDistinct(),
    foreignKey({ columns: [t.siteId, t.cellId], foreignColumns: [cells.siteId, cells.id] }),
    index().on(t.accountId),
    index().on(t.siteId, t.cellId),
    check("account_roles_role", isRole(t.role)),
    check("account_roles_cell", sql`(${t.role} = 'lead') = (${t.cellId} is not null)`),
  ],
);

/** The worker that an account is: own hours on the phone, a lead's acts at the kiosk. */
export const accountWorkers = pgTable(
  "account_workers",
  {
    siteId: siteId(),
    accountId: uuid()
      .notNull()
      .references(() => accounts.id),
    workerId: uuid().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.accountId] }),
    unique().on(t.siteId, t.workerId),
    index().on(t.accountId),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
  ],
);

/** A browser that signed in to the office; revoking the row ends it at the next request. */
export const officeSessions = pgTable(
  "office_sessions",
  {
    id: uuid().primaryKey(),
    accountId: uuid()
      .notNull()
      .references(() => accounts.id),
    createdAt: instantAt().notNull().defaultNow(),
    lastSeenAt: instantAt().notNull().defaultNow(),
    expiresAt: instantAt().notNull(),
    revokedAt: instantAt(),
  },
  (t) => [index().on(t.accountId)],
);

/** A Bearer key for integration; only its SHA-256 is kept. */
export const apiKeys = pgTable(
  "api_keys",
  {
    id: uuid().primaryKey(),
    siteId: siteId().references(() => sites.id),
    role: text({ enum: roles as [string, ...string[]] }).notNull(),
    name: text().notNull(),
    keyHash: text().notNull().unique(),
    createdAt: instantAt().notNull().defaultNow(),
    lastUsedAt: instantAt(),
    revokedAt: instantAt(),
  },
  (t) => [index().on(t.siteId), check("api_keys_role", isRole(t.role))],
);

/** A one-time link that makes the first admin of an empty installation. */
export const setupLinks = pgTable("setup_links", {
  id: uuid().primaryKey(),
  tokenHash: text().notNull().unique(),
  expiresAt: instantAt().notNull(),
  usedAt: instantAt(),
});

/** Failed PIN and password tries: one row per thing that is slowed down. */
export const throttles = pgTable("throttles", {
  /** What is slowed: `pin:<site>:<worker>:<kiosk>`, `worker:…`, `kiosk:…`, `email:…`. */
  key: text().primaryKey(),
  failures: integer().notNull().default(0),
  blockedUntil: instantAt(),
  lastFailedAt: instantAt().notNull(),
});
