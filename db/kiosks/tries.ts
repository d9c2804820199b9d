import { sql } from "drizzle-orm";
import { throttles } from "@/db/access/tables";
import type { Db } from "@/db/client";

/** A thing that is slowed down, and its wait after the n-th wrong try, at index n − 1. */
export interface Slowed {
  key: string;
  waitsSeconds: readonly number[];
}

/**
 * Takes a place for one try at a PIN before it is checked, in one statement: at the first thing,
 * then the next, and so on. One that is blocked ends it, so that tries at a blocked one slow nothing
 * else down. Counts as wrong until `clearTries` or `takeBackTry`.
 *
 * @returns how many seconds are still to wait; 0 means that this try may be made
 */
export async function reserveTries(db: Db, slowed: readonly Slowed[], now: Date): Promise<number> {
  const at = sql`${now.toISOString()}::timestamptz`;
  const steps = slowed.map(({ key, waitsSeconds }, place) => {
    const waits = sql`${sql.param(waitsSeconds)}::int[]`;
    const until = (nth: unknown) =>
      sql`${at} + (${waits})[least(${nth}, array_length(${waits}, 1))] * interval '1 second'`;
    const source = place === 0 ? sql`(values (1)) as first` : step(place - 1);
    return sql`${step(place)} as (
      insert into throttles as t (key, failures, last_failed_at, blocked_until)
      select ${key}, 1, ${at}, ${until(sql`1`)} from ${source}
      on conflict (key) do update
        set failures = t.failures + 1, last_failed_at = ${at},
          blocked_until = ${until(sql`t.failures + 1`)}
        where t.blocked_until is null or t.blocked_until <= ${at}
      returning 1)`;
  });
  const keys = slowed.map(({ key }) => key);
  const { rows } = await db.execute<{ free: boolean; seconds: number | null }>(sql`
    with ${sql.join(steps, sql`, `)}
    select exists (select from ${step(slowed.length - 1)}) as free,
      extract(epoch from max(b.blocked_until) - ${at})::float8 as seconds
    from throttles b
    where b.key = any (${sql.param(keys)}::text[]) and b.blocked_until > ${at}`);
  const [answer] = rows;
  return answer?.free ? 0 : Math.max(1, Math.ceil(answer?.seconds ?? 1));
}

/** Takes back one try that was right, where others before it still count. */
export async function takeBackTry(db: Db, key: string): Promise<void> {
  await db
    .update(throttles)
    .set({ failures: sql`greatest(0, ${throttles.failures} - 1)`, blockedUntil: null })
    .where(sql`${throttles.key} = ${key}`);
}

/** Adds to a count that may not pass `max`; false, and nothing added, where it would. */
export async function addUpTo(
  db: Db,
  { key, parts, max, now }: { key: string; parts: number; max: number; now: Date },
): Promise<boolean> {
  if (parts > max) return false;
  const added = await db
    .insert(throttles)
    .values({ key, failures: parts, lastFailedAt: now })
    .onConflictDoUpdate({
      target: throttles.key,
      set: { failures: sql`${throttles.failures} + ${parts}`, lastFailedAt: now },
      setWhere: sql`${throttles.failures} + ${parts} <= ${max}`,
    })
    .returning({ key: throttles.key });
  return added.length > 0;
}

const step = (place: number) => sql.raw(`step_${place}`);
