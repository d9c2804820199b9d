import {
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

/** A tablet that belongs to the site; the device cookie's SHA-256 is its proof. */
export const kiosks = pgTable(
  "kiosks",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    name: text().notNull(),
    tokenHash: text().notNull().unique(),
    enrolledAt: instantAt().notNull().defaultNow(),
    lastSeenAt: instantAt(),
    revokedAt: instantAt(),
    /** What the kiosk last said of itself. */
    build: text(),
    queued: integer(),
    batteryPercent: integer(),
    sealKid: text(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.id] })],
);

/** The cells that a kiosk serves from an instant on; the rows of the latest instant count. */
export const kioskCells = pgTable(
  "kiosk_cells",
  {
    siteId: siteId(),
    id: id(),
    kioskId: uuid().notNull(),
    cellId: uuid().notNull(),
    position: integer().notNull().default(0),
    effectiveFrom: instantAt().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.kioskId], foreignColumns: [kiosks.siteId, kiosks.id] }),
    foreignKey({ columns: [t.siteId, t.cellId], foreignColumns: [cells.siteId, cells.id] }),
    index().on(t.siteId, t.kioskId, t.effectiveFrom),
    index().on(t.siteId, t.cellId),
  ],
);

/** A one-time code with which a browser becomes a kiosk of a cell, valid for ten minutes. */
export const enrolmentCodes = pgTable(
  "enrolment_codes",
  {
    siteId: siteId(),
    id: id(),
    codeHash: text().notNull().unique(),
    name: text().notNull(),
    cellId: uuid().notNull(),
    expiresAt: instantAt().notNull(),
    usedAt: instantAt(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.cellId], foreignColumns: [cells.siteId, cells.id] }),
    index().on(t.siteId, t.cellId),
  ],
);

/** One PIN entry at one kiosk (LEDGER.md 9); every event names its session. */
export const kioskSessions = pgTable(
  "kiosk_sessions",
  {
    siteId: siteId(),
    id: id(),
    kioskId: uuid().notNull(),
    workerId: uuid().notNull(),
    tokenHash: text().unique(),
    /** SHA-256 of the sealed credential once it was verified, so that it is verified only once. */
    sealedHash: text(),
    openedAt: instantAt().notNull(),
    endedAt: instantAt(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.kioskId], foreignColumns: [kiosks.siteId, kiosks.id] }),
    foreignKey({ columns: [t.siteId, t.workerId], foreignColumns: [workers.siteId, workers.id] }),
    index().on(t.siteId, t.kioskId),
    index().on(t.siteId, t.workerId, t.openedAt),
  ],
);

/** Sealed credentials that came while their tries were slowed down: a job tries them again. */
export const sealedBoxes = pgTable(
  "sealed_boxes",
  {
    siteId: siteId(),
    /** The session that the box proves. */
    id: id(),
    kioskId: uuid().notNull(),
    workerNumber: text().notNull(),
    sealed: text().notNull(),
    keptAt: instantAt().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.siteId, t.id] }),
    foreignKey({ columns: [t.siteId, t.kioskId], foreignColumns: [kiosks.siteId, kiosks.id] }),
    index().on(t.siteId, t.kioskId),
  ],
);

/** HPKE key pairs with which kiosks seal credentials; old ones are kept (LEDGER.md 9). */
export const sealKeys = pgTable(
  "seal_keys",
  {
    siteId: siteId().references(() => sites.id),
    id: id(),
    kid: text().notNull(),
    publicKey: text().notNull(),
    privateKey: text().notNull(),
    createdAt: instantAt().notNull().defaultNow(),
    retiredAt: instantAt(),
  },
  (t) => [primaryKey({ columns: [t.siteId, t.id] }), unique().on(t.siteId, t.kid)],
);
