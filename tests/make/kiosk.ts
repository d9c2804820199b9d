import { eq } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { hashPassword } from "@/app/_server/password";
import { hashSecret, newSecret } from "@/app/_server/secret";
import { accountRoles, accounts, accountWorkers } from "@/db/access/tables";
import { kioskCells, kioskSessions, kiosks } from "@/db/kiosks/tables";
import { workers } from "@/db/people/tables";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import type { Factory } from "@/tests/make/factory";

/** A tablet of the factory, with the session of its worker 1042. */
export interface MadeKiosk {
  kioskId: string;
  cookie: string;
  session: string;
}

/** Enrols a kiosk in a cell of the factory and opens a session on it, at `openedAt`. */
export async function makeKiosk(
  factory: Factory,
  {
    cell = "Mill",
    openedAt = "2026-05-14T05:00:00Z",
  }: { cell?: keyof Factory["cellIds"]; openedAt?: string } = {},
): Promise<MadeKiosk> {
  const { db, siteId, cellIds, workerId } = factory;
  const [kioskId, session, token] = [uuid(), uuid(), newSecret()];
  const effectiveFrom = new Date("2026-01-01T00:00:00Z");
  await db.insert(kiosks).values({
    siteId,
    id: kioskId,
    name: cell,
    tokenHash: hashSecret(token),
    enrolledAt: effectiveFrom,
  });
  await db
    .insert(kioskCells)
    .values({ siteId, id: uuid(), kioskId, cellId: cellIds[cell], effectiveFrom });
  await db
    .insert(kioskSessions)
    .values({ siteId, id: session, kioskId, workerId, openedAt: new Date(openedAt) });
  return { kioskId, cookie: `bookmatch_kiosk=${token}`, session };
}

/** Adds a worker to the factory, with a PIN where one is given. */
export async function makeWorker(
  { db, siteId, cellIds }: Factory,
  worker: { number: string; pin?: string; cell?: keyof Factory["cellIds"] },
): Promise<string> {
  const { number, pin, cell = "Mill" } = worker;
  const id = uuid();
  await db.insert(workers).values({
    siteId,
    id,
    number,
    name: `Worker ${number}`,
    homeCellId: cellIds[cell],
    pinHash: pin ? await hashPassword(pin) : null,
  });
  return id;
}

/** Makes a worker the lead of cells, and opens a session of theirs on a kiosk. */
export async function makeLead(
  { db, siteId, cellIds }: Factory,
  kiosk: MadeKiosk,
  lead: { workerId: string; cells: (keyof Factory["cellIds"])[] },
): Promise<string> {
  const [accountId, session] = [uuid(), uuid()];
  const email = `${accountId}@example.test`;
  await db.insert(accounts).values({ id: accountId, email, name: "Lead", passwordHash: "-" });
  await db.insert(accountWorkers).values({ siteId, accountId, workerId: lead.workerId });
  await db.insert(accountRoles).values(
    lead.cells.map((cell) => ({
      siteId,
      id: uuid(),
      accountId,
      role: "lead",
      cellId: cellIds[cell],
    })),
  );
  const openedAt = new Date("2026-05-14T05:00:00Z");
  await db
    .insert(kioskSessions)
    .values({ siteId, id: session, kioskId: kiosk.kioskId, workerId: lead.workerId, openedAt });
  return session;
}

/** Gives the factory's worker 1042 a PIN. */
export async function givePin({ db, workerId }: Factory, pin: string): Promise<void> {
  await db
    .update(workers)
    .set({ pinHash: await hashPassword(pin) })
    .where(eq(workers.id, workerId));
}

let seq = 0;

/** An event of worker 1042 at an instant of 14 May 2026, in UTC, such as "08:00" or "08:00:30". */
export function tap(
  kiosk: MadeKiosk,
  time: string,
  body: EventBody,
  more: Partial<ClockEvent> = {},
): ClockEvent {
  seq += 1;
  const at = time.includes("T") ? time : `2026-05-14T${time.padEnd(8, ":00").slice(0, 8)}Z`;
  return {
    id: uuid(),
    v: 1,
    session: kiosk.session,
    worker: "1042",
    at,
    clock: { offsetMs: 0, uncertaintyMs: 20, boot: "b1", monotonicMs: seq * 1000, seq },
    ...body,
    ...more,
  } as ClockEvent;
}
