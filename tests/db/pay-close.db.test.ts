import { sql } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { readAdjustments } from "@/db/pay/adjustments";
import { readCards, sha256 } from "@/db/pay/cards";
import { closePeriod, reopenPeriod } from "@/db/pay/close";
import { addPolicyVersion } from "@/db/pay/commands";
import { exportPeriod, readPayFile } from "@/db/pay/exports";
import { listFrozenRows } from "@/db/pay/frozen";
import { findPeriod } from "@/db/pay/queries";
import { dayText } from "@/lib/agreement/day-text";
import { agreementSubject } from "@/lib/agreement/signatures";
import { policyOf } from "@/lib/pay/presets";
import { type Factory, makeFactory, makeWorker } from "@/tests/make/factory";
import {
  AFTER,
  CLERK,
  dropShift,
  FORTNIGHT,
  local,
  makeEnd,
  makePeriods,
  makeRecord,
  makeShift,
  TIME_ZONE,
} from "@/tests/make/pay-period";
import { withDb } from "@/tests/setup/db";

const asked = (periodId: string, other: Partial<Parameters<typeof closePeriod>[1]> = {}) => ({
  periodId,
  timeZone: TIME_ZONE,
  now: AFTER,
  named: [],
  reason: "",
  ...other,
});
const byName = (factory: Factory, ...others: string[]) => ({
  named: [factory.workerId, ...others],
  reason: "the bank closes at noon",
});
const cardsOf = (factory: Factory) =>
  readCards(factory, {
    ...FORTNIGHT,
    isClosed: false,
    timeZone: TIME_ZONE,
    nowMs: AFTER.getTime(),
  });
const now = { timeZone: TIME_ZONE, nowMs: AFTER.getTime() };
const detail = (answer: { ok: boolean; problem?: { detail: string } }) => answer.problem?.detail;

/** A factory whose one worker worked a week of five times ten hours with a meal. */
async function makeWorked(db: Factory["db"]) {
  const factory = await makeFactory(db);
  const periods = await makePeriods(factory);
  for (const day of ["01", "02", "03", "04", "05"]) {
    await makeShift(factory, {
      start: `2026-06-${day}T06:00`,
      end: `2026-06-${day}T16:30`,
      meal: [`2026-06-${day}T11:00`, `2026-06-${day}T11:30`],
    });
  }
  return { factory, ...periods };
}

/** The lead agrees to every day of the worker's card as it is now. */
async function agree(factory: Factory) {
  const [card] = (await cardsOf(factory)).cards;
  for (const { date, startMs, endMs } of card!.days) {
    const parts = await factory.db.execute(sql`
      select epoch_ms(start_at)::float8 as "startMs", epoch_ms(end_at)::float8 as "endMs", item,
        activity, ticket, operation, code, seconds
      from segments where site_id = ${factory.siteId} and worker_id = ${factory.workerId}`);
    // safe because the columns are those of a part
    const text = dayText(parts.rows as never, { date, startMs, endMs, policy: "us-federal 1" });
    const body = { kind: "confirm", subject: agreementSubject(date, sha256(text!)) };
    const at = new Date(AFTER.getTime() - 3_600_000);
    await makeRecord(factory, { kind: "confirm", at, receivedAt: at, body, by: "account:lead" });
  }
}

describe("closePeriod", () => {
  test("refuses what nobody agreed to, and freezes it by name with the reason", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      expect(detail(await closePeriod(factory, asked(ended), CLERK))).toContain(
        "Still to look at: Ilo Varn.",
      );
      const unreasoned = { ...byName(factory), reason: " " };
      expect(detail(await closePeriod(factory, asked(ended, unreasoned), CLERK))).toContain("why");
      const closed = await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      expect(closed).toMatchObject({ value: { revision: 1 } });
      const file = await readPayFile(factory, { periodId: ended, revision: 1, siteName: "T" });
      expect(file.totals).toMatchObject({
        headcount: 1,
        paidSeconds: 50 * 3600,
        buckets: { regular: 40 * 3600, overtime: 10 * 3600, double: 0 },
        hours: { paid: "50.00", overtime: "10.00" },
        closedWithQuestions: [
          { worker: "1042", name: "Ilo Varn", reason: "the bank closes at noon" },
        ],
      });
    }));

  test("closes what the lead agreed to without asking, and asks again when a day changed since", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      await agree(factory);
      expect((await cardsOf(factory)).cards[0]).toMatchObject({
        state: "agreed",
        signedByLead: true,
        signedByWorker: false,
      });
      await dropShift(factory, "2026-06-05T06:00");
      await makeShift(factory, { start: "2026-06-05T06:00", end: "2026-06-05T12:00" });
      expect((await cardsOf(factory)).cards[0]!.state).toBe("to look at");
      expect((await cardsOf(factory)).cards[0]!.days.at(-1)!.agreement).toMatchObject({
        lead: null,
        hasLapsed: true,
      });
      await agree(factory);
      expect(await closePeriod(factory, asked(ended), CLERK)).toMatchObject({ ok: true });
    }));

  test("a question about the time makes a card one to look at, agreed or not", () =>
    withDb(async (db) => {
      const { factory } = await makeWorked(db);
      await agree(factory);
      await makeEnd(factory, "2026-06-05T16:00");
      expect((await cardsOf(factory)).cards[0]!.state).toBe("to look at");
    }));

  test("the same period is not closed twice, nor while it runs, nor before an earlier one", () =>
    withDb(async (db) => {
      const { factory, ended, running } = await makeWorked(db);
      const later = asked(running, { ...byName(factory), now: new Date("2026-07-01T12:00:00Z") });
      expect(detail(await closePeriod(factory, later, CLERK))).toContain(
        "The period from 2026-05-31 is still open.",
      );
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      expect(detail(await closePeriod(factory, asked(ended), CLERK))).toBe(
        "Winifred Ashgrove has closed this period already. Nothing was changed.",
      );
      expect(detail(await closePeriod(factory, asked(running), CLERK))).toContain("still runs");
      expect(await listFrozenRows(factory, { periodId: ended, revision: 2 })).toEqual([]);
    }));

  test("without a policy there is nothing to close by", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      const bare = await makeFactory(db);
      expect(detail(await closePeriod(bare, asked(ended), CLERK))).toContain("no such pay period");
      expect((await readCards(bare, { ...FORTNIGHT, isClosed: false, ...now })).overMs).toBeNull();
      expect(factory.siteId).not.toBe(bare.siteId);
    }));

  test("people without hours are named beside the file, not in it", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      const idle = await makeWorker(factory, "1043");
      await db.execute(sql`update workers set created_at = '2026-01-01' where id = ${idle}`);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      const file = await readPayFile(factory, { periodId: ended, revision: 1, siteName: "T" });
      expect(file.people.map(({ worker }) => worker)).toEqual(["1042"]);
      expect(file.totals.withoutHours).toEqual([{ worker: "1043", name: "Worker 1043" }]);
    }));

  test("no policy may be set for days that are closed", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      const version = { name: "straight", policy: policyOf("straight"), after: 0, reason: "cheap" };
      const back = await addPolicyVersion(
        factory,
        { ...version, effectiveOn: "2026-06-13" },
        CLERK,
      );
      expect(detail(back)).toBe(
        "Days before 2026-06-14 are closed and paid. Choose 2026-06-14 or later.",
      );
      const from = { ...version, effectiveOn: "2026-06-14" };
      expect(await addPolicyVersion(factory, from, CLERK)).toMatchObject({ ok: true });
    }));

  test("what is frozen cannot be changed, not even by the app", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      for (const table of ["pay_rows", "pay_cards", "pay_revisions"]) {
        const change = db.transaction((tx) => tx.execute(sql.raw(`delete from ${table}`)));
        await expect(change).rejects.toMatchObject({
          cause: { message: `permission denied for table ${table}` },
        });
      }
    }));
});

describe("readAdjustments", () => {
  const correction = { kind: "void", receivedAt: new Date("2026-06-16T15:00:00Z") };

  test("a correction after the close appears with its reference, overtime and all", () =>
    withDb(async (db) => {
      const { factory, ended, running } = await makeWorked(db);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      expect(await readAdjustments(factory, now)).toEqual([]);
      // a day of the first half goes: the later ones come down out of overtime
      await dropShift(factory, "2026-06-01T06:00");
      const at = local("2026-06-01T06:00");
      await makeRecord(factory, { ...correction, at });
      const found = await readAdjustments(factory, now);
      expect(found.map(({ date, paidSeconds, buckets }) => [date, paidSeconds, buckets])).toEqual([
        ["2026-06-01", -36_000, { regular: -36_000, overtime: 0, double: 0 }],
        ["2026-06-05", 0, { regular: 36_000, overtime: -36_000, double: 0 }],
      ]);
      expect(found[0]).toMatchObject({ aboutId: ended, policy: "us-federal 1" });

      const later = asked(running, { ...byName(factory), now: new Date("2026-07-01T12:00:00Z") });
      expect(await closePeriod(factory, later, CLERK)).toMatchObject({ ok: true });
      const file = await readPayFile(factory, { periodId: running, revision: 1, siteName: "T" });
      expect(
        file.people[0]!.adjustments.map(({ reference, hours }) => [reference, hours.paid]),
      ).toEqual([
        ["2026-05-31/2026-06-01", "-10.00"],
        ["2026-05-31/2026-06-05", "0.00"],
      ]);
      expect(await readAdjustments(factory, now)).toEqual([]);
    }));

  test("what was closed by name is looked at again, also without a new record", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      await makeShift(factory, { start: "2026-06-06T06:00", end: "2026-06-06T08:00" });
      expect(await readAdjustments(factory, now)).toMatchObject([
        { date: "2026-06-06", paidSeconds: 7200, buckets: { overtime: 7200 } },
      ]);
    }));

  test("reopening makes the next revision; the first one, its rows and its file stay", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      const write = async () => Buffer.from("as it was");
      const file = {
        periodId: ended,
        format: "csv",
        siteName: "T",
        by: "key:1",
        now: AFTER,
        write,
      } as const;
      await exportPeriod(factory, file);
      const reopened = { periodId: ended, reason: "a whole shift was missing" };
      expect(await reopenPeriod(factory, reopened, CLERK)).toMatchObject({ ok: true });
      expect(detail(await reopenPeriod(factory, reopened, CLERK))).toContain("is open");
      expect(detail(await exportPeriod(factory, file))).toContain("Close it");
      await makeShift(factory, { start: "2026-06-06T06:00", end: "2026-06-06T08:00" });
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      expect(await findPeriod(factory, ended)).toMatchObject({ revision: 2, isClosed: true });
      const first = await exportPeriod(factory, { ...file, revision: 1 });
      expect(first.ok && Buffer.from(first.value.bytes).toString()).toBe("as it was");
      expect(await listFrozenRows(factory, { periodId: ended, revision: 1 })).toHaveLength(5);
      expect(await listFrozenRows(factory, { periodId: ended, revision: 2 })).toHaveLength(6);
      expect(await readAdjustments(factory, now)).toEqual([]);
    }));
});

describe("exportPeriod", () => {
  test("the bytes are stored when first made and are the same for ever", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      const file = {
        periodId: ended,
        format: "json",
        siteName: "T",
        by: "key:1",
        now: AFTER,
      } as const;
      const write = (text: string) => ({ ...file, write: async () => Buffer.from(text) });
      expect(detail(await exportPeriod(factory, write("no")))).toContain("This period is open.");
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      const first = await exportPeriod(factory, write("first"));
      const second = await exportPeriod(factory, write("second"));
      expect(second).toEqual(first);
      expect(first).toMatchObject({ value: { digest: sha256("first"), revision: 1 } });
      expect(detail(await exportPeriod(factory, { ...write("x"), revision: 2 }))).toContain(
        "no revision 2",
      );
    }));

  test("after its bytes were erased it says so, and keeps digest and totals", () =>
    withDb(async (db) => {
      const { factory, ended } = await makeWorked(db);
      await closePeriod(factory, asked(ended, byName(factory)), CLERK);
      const write = async () => Buffer.from("names");
      const file = {
        periodId: ended,
        format: "csv",
        siteName: "T",
        by: "key:1",
        now: AFTER,
        write,
      } as const;
      await exportPeriod(factory, file);
      await db.execute(sql`update pay_exports set bytes = null, erased_at = now()`);
      expect(await exportPeriod(factory, file)).toMatchObject({ problem: { code: "gone" } });
    }));
});
