import { recordAct } from "@/db/audit/commands";
import type { Db, Scope } from "@/db/client";
import { bookHistory, settleHistory } from "@/db/seed/events";
import { writeFactory } from "@/db/seed/factory";
import { writeKiosks, writeSessions } from "@/db/seed/kiosks";
import { writePay } from "@/db/seed/pay";
import { type Hash, writeAccounts, writePlannedShifts, writeWorkers } from "@/db/seed/people";
import { DEMO_SITE_ID } from "@/db/seed/sign-ins";
import { writeTickets } from "@/db/seed/tickets";
import { findFirstSite, foundSite } from "@/db/sites/found";
import { TIME_ZONE } from "@/lib/demo/calendar";
import { no, ok, type Result } from "@/lib/result";
import { type DemoRun, type Scenario, simulate } from "@/lib/simulation/simulate";
import { localDate } from "@/lib/time/site-day";

/** How far the loading has come: what it is at, and how much of that is done, 0 to 1. */
type Progress = (step: string, share: number) => void;

export interface Loading extends Omit<Scenario, "nowMs"> {
  db: Db;
  /** The instant up to which the history is told. */
  now: Date;
  hash: Hash;
  onProgress?: Progress;
}

/** What was loaded. */
export interface Loaded {
  siteId: string;
  events: number;
  tickets: number;
}

/**
 * Loads Larkmoor Stringworks: an invented factory with eight weeks behind it and a shift that runs.
 * Its hours are not written: the events of its people are, and all else follows from them as it does
 * from a kiosk's. All of it or nothing; refused where there is a site already.
 */
export async function loadDemo(loading: Loading): Promise<Result<Loaded>> {
  const { db, now, hash, onProgress = () => undefined, ...slice } = loading;
  if (await findFirstSite(db)) {
    return no("conflict", "There is a factory here already. The demo wants an empty installation.");
  }
  onProgress("Playing eight weeks at Larkmoor Stringworks", 0);
  const run = simulate({ nowMs: now.getTime(), ...slice });
  const detail = { events: run.events.length, tickets: run.tickets.length };
  return db.transaction(async (tx) => {
    const site = { id: DEMO_SITE_ID, name: "Larkmoor Stringworks", timeZone: TIME_ZONE };
    const scope = { db: tx, siteId: await foundSite(tx, site) };
    onProgress("Building the factory", 0);
    const kiosks = await writeHouse(scope, run, { hash, now });
    await bookHistory(scope, kiosks, run.events, (share) => onProgress("Booking its hours", share));
    onProgress("Judging its tickets", 0);
    await settleHistory(scope, now);
    const subject = `site:${scope.siteId}`;
    await recordAct(scope, { by: "command:demo", action: "demo.load", subject, detail });
    return ok({ siteId: scope.siteId, ...detail });
  });
}

/** Writes what stands in the house before the first shift; answers the kiosks by cell. */
async function writeHouse(
  scope: Scope,
  run: DemoRun,
  { hash, now }: { hash: Hash; now: Date },
): Promise<ReadonlyMap<string, string>> {
  const { calendar, shifts, sessions, tickets } = run;
  const ids = await writeFactory(scope, calendar.startsOn);
  const workers = await writeWorkers(scope, ids, { hash, now });
  await writeAccounts(scope, { ...ids, workers }, hash);
  const enrolledAt = new Date(calendar.startsAt * 1000);
  const kiosks = await writeKiosks(scope, ids, { enrolledAt, lastSeenAt: now });
  await writePlannedShifts(scope, workers, shifts);
  await writeSessions(scope, { kiosks, workers }, sessions);
  await writeTickets(scope, ids, tickets);
  const today = localDate(now.getTime(), TIME_ZONE);
  await writePay(scope, { startsOn: calendar.startsOn, today });
  return kiosks;
}
