import { sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { addPolicyVersion, choosePolicy, openDuePeriods, setRhythm } from "@/db/pay/commands";
import { listPeriods, listPolicyVersions, readPolicyBook } from "@/db/pay/queries";
import { policyOf } from "@/lib/pay/presets";
import { policyLabel, policyOn } from "@/lib/policies/in-force";
import { makeFactory } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const clerk = { by: "account:payroll", name: "Winifred Ashgrove" };
const straight = {
  name: "straight",
  policy: policyOf("straight"),
  effectiveOn: "2026-01-05",
  reason: "from the handbook",
  after: 0,
};
const choice = (other: Partial<Parameters<typeof choosePolicy>[1]> = {}) => ({
  id: uuid(),
  worker: "",
  policy: "straight",
  effectiveOn: "2026-01-05",
  reason: "from the handbook",
  ...other,
});

describe("addPolicyVersion", () => {
  test("adds versions of a name one after the other, and keeps the ones before", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await addPolicyVersion(factory, straight, clerk);
      const second = { ...straight, effectiveOn: "2026-06-01", after: 1 };
      expect(await addPolicyVersion(factory, second, clerk)).toMatchObject({
        value: { version: 2 },
      });
      const versions = await listPolicyVersions(factory);
      expect(versions.map(({ version, effectiveOn }) => [version, effectiveOn])).toEqual([
        [1, "2026-01-05"],
        [2, "2026-06-01"],
      ]);
    }));

  test("sent twice, or by two at once, it adds one", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await addPolicyVersion(factory, straight, clerk);
      expect(await addPolicyVersion(factory, straight, clerk)).toMatchObject({
        ok: false,
        problem: { code: "conflict", detail: expect.stringContaining("Version 1 of straight") },
      });
      expect(await listPolicyVersions(factory)).toHaveLength(1);
    }));

  test("no version is ever changed or taken away, not even by the app itself", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await addPolicyVersion(factory, straight, clerk);
      const change = db.transaction((tx) => tx.execute(sql`update pay_policies set version = 9`));
      await expect(change).rejects.toMatchObject({
        cause: { message: "permission denied for table pay_policies" },
      });
    }));
});

describe("choosePolicy", () => {
  test("puts the site under a policy, and a worker under another from a day on", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await addPolicyVersion(factory, straight, clerk);
      const california = { ...straight, name: "us-california", policy: policyOf("us-california") };
      await addPolicyVersion(factory, california, clerk);
      await choosePolicy(factory, choice(), clerk);
      const own = choice({ worker: "1042", policy: "us-california", effectiveOn: "2026-06-01" });
      expect(await choosePolicy(factory, own, clerk)).toMatchObject({ ok: true });
      const book = await readPolicyBook(factory);
      const label = (date: string) => policyLabel(policyOn(book, factory.workerId, date)!);
      expect([label("2026-05-31"), label("2026-06-01")]).toEqual(["straight 1", "us-california 1"]);
    }));

  test.each([
    [{ worker: "9999" }, "Nobody here has this number."],
    [{ policy: "lunar" }, "There is no such policy yet. Add it first."],
    [{ policy: "" }, "Choose a policy."],
  ])("%j is refused: %s", (change, detail) =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await addPolicyVersion(factory, straight, clerk);
      const answer = await choosePolicy(factory, choice(change), clerk);
      expect(answer).toMatchObject({ ok: false, problem: { detail } });
    }),
  );

  test("nothing of it is seen at another site with the same numbers", () =>
    withDb(async (db) => {
      const [here, there] = [await makeFactory(db), await makeFactory(db)];
      await addPolicyVersion(here, straight, clerk);
      await choosePolicy(here, choice(), clerk);
      expect(await readPolicyBook(there)).toEqual({ versions: [], choices: [] });
    }));
});

describe("openDuePeriods", () => {
  test("opens what is due once, however often it is asked", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      expect(await openDuePeriods(factory, "2026-06-10")).toBe(0);
      const rhythm = { id: uuid(), startsOn: "2026-05-31", days: 14, reason: "handbook" };
      await setRhythm(factory, rhythm, { ...clerk, today: "2026-06-10" });
      await setRhythm(factory, rhythm, { ...clerk, today: "2026-06-10" });
      expect(await openDuePeriods(factory, "2026-06-13")).toBe(0);
      expect(await openDuePeriods(factory, "2026-06-14")).toBe(1);
      const periods = await listPeriods(factory, { limit: 10 });
      expect(periods.map(({ from, to, isClosed }) => [from, to, isClosed])).toEqual([
        ["2026-06-14", "2026-06-28", false],
        ["2026-05-31", "2026-06-14", false],
      ]);
    }));
});
