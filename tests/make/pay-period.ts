import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { clockEvents } from "@/db/ledger/tables";
import { addPolicyVersion, choosePolicy, setRhythm } from "@/db/pay/commands";
import { listPeriods } from "@/db/pay/queries";
import { looseEnds, segments, shifts, timelineHeads } from "@/db/timeline/tables";
import { policyOf } from "@/lib/pay/presets";
import type { PresetName } from "@/lib/pay/schema";
import { boundaryMs } from "@/lib/time/wall-time";
import type { Factory } from "@/tests/make/factory";

export const CLERK = { by: "account:payroll", name: "Winifred Ashgrove" };
export const TIME_ZONE = "America/Chicago";
/** 31 May 2026 is a Sunday; the fortnight ends with Saturday 13 June. */
export const FORTNIGHT = { from: "2026-05-31", to: "2026-06-14" };
export const AFTER = new Date("2026-06-15T15:00:00Z");

/** Puts a factory on a policy and fortnights, of which the first is over; answers its id. */
export async function makePeriods(factory: Factory, preset: PresetName = "us-federal") {
  const entered = { effectiveOn: "2026-01-01", reason: "from the handbook" };
  const version = { name: preset, policy: policyOf(preset), after: 0, ...entered };
  await addPolicyVersion(factory, version, CLERK);
  await choosePolicy(factory, { id: uuid(), worker: "", policy: preset, ...entered }, CLERK);
  const rhythm = { id: uuid(), startsOn: FORTNIGHT.from, days: 14, reason: "from the handbook" };
  await setRhythm(factory, rhythm, { ...CLERK, today: "2026-06-15" });
  const periods = await listPeriods(factory, { limit: 10 });
  return { ended: periods.at(-1)!.id, running: periods[0]!.id };
}

/** An instant of local time: "2026-06-01T06:00". */
export const local = (text: string) => new Date(boundaryMs(text, TIME_ZONE));

/** Puts a shift of one segment, or with a meal in it, into the timeline as the fold would have. */
export async function makeShift(
  { db, siteId, workerId }: Factory,
  shift: { start: string; end: string; meal?: [string, string]; worker?: string },
): Promise<void> {
  const { start, end, meal, worker = workerId } = shift;
  const cuts = [start, ...(meal ?? []), end].map(local);
  await db.execute(sql`select make_partition('segments', ${cuts[0]!.toISOString()}::timestamptz)`);
  const [startEventId, endEventId] = [uuid(), uuid()];
  const of = { siteId, workerId: worker };
  await db
    .insert(shifts)
    .values({ ...of, startAt: cuts[0]!, endAt: cuts.at(-1)!, startEventId, endEventId });
  await db.insert(segments).values(
    cuts.slice(1).map((endAt, at) => ({
      ...of,
      startAt: cuts[at]!,
      endAt,
      item: 0,
      activity: at === 1 ? ("meal" as const) : ("indirect" as const),
      seconds: (endAt.getTime() - cuts[at]!.getTime()) / 1000,
      eventId: startEventId,
    })),
  );
  await grown({ db, siteId }, worker);
}

/** Takes a shift out of the timeline, as if its records had been voided. */
export async function dropShift({ db, siteId, workerId }: Factory, start: string): Promise<void> {
  const at = local(start).toISOString();
  await db.execute(sql`
    delete from segments where site_id = ${siteId} and worker_id = ${workerId}
      and start_at >= ${at}::timestamptz and start_at < ${at}::timestamptz + interval '20 hours'`);
  await db.execute(sql`
    delete from shifts where site_id = ${siteId} and worker_id = ${workerId}
      and start_at = ${at}::timestamptz`);
  await grown({ db, siteId }, workerId);
}

/** A record of the ledger that concerns an instant, received at another. */
export async function makeRecord(
  { db, siteId, workerId }: Factory,
  record: { kind: string; at: Date; receivedAt: Date; body?: object; by?: string },
): Promise<void> {
  const { kind, at, receivedAt, body = {}, by = null } = record;
  const month = receivedAt.toISOString();
  await db.execute(sql`select make_partition('clock_events', ${month}::timestamptz)`);
  const row = { siteId, workerId, workerNumber: "1042", id: uuid(), kind, at, receivedAt, by };
  await db.insert(clockEvents).values({ ...row, seq: 1, body, bodyHash: uuid() });
}

/** Something about a worker's time that nobody has settled. */
export async function makeEnd({ db, siteId, workerId }: Factory, at: string): Promise<void> {
  const end = { siteId, workerId, code: "no-shift-end", source: "fold" as const, at: local(at) };
  await db.insert(looseEnds).values({ ...end, subject: uuid() });
}

async function grown({ db, siteId }: Pick<Factory, "db" | "siteId">, workerId: string) {
  await db
    .insert(timelineHeads)
    .values({ siteId, workerId, version: 1, asOf: new Date() })
    .onConflictDoUpdate({
      target: [timelineHeads.siteId, timelineHeads.workerId],
      set: { version: sql`${timelineHeads.version} + 1` },
    });
}
