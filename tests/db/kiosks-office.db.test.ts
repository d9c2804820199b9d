import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import type { Db } from "@/db/client";
import { changeKiosk, revokeKiosk } from "@/db/kiosks/commands";
import { addEnrolmentCode } from "@/db/kiosks/enrolment";
import { listKiosks } from "@/db/kiosks/queries";
import { enrolmentCodes, kioskCells, kiosks } from "@/db/kiosks/tables";
import { makeFactory } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const at = (hour: number) => new Date(Date.UTC(2026, 4, 14, hour));
const hand = (hour: number) => ({ by: "account:test", now: at(hour) });

async function withKiosk(db: Db) {
  const factory = await makeFactory(db);
  const { siteId, cellIds } = factory;
  const id = uuid();
  await db.insert(kiosks).values({ siteId, id, name: "Mill 1", tokenHash: uuid() });
  const row = { siteId, id: uuid(), kioskId: id, cellId: cellIds.Mill };
  await db.insert(kioskCells).values({ ...row, effectiveFrom: at(6) });
  return { ...factory, id };
}

const listed = async (scope: Awaited<ReturnType<typeof withKiosk>>, hour: number) =>
  (await listKiosks(scope, at(hour))).map(({ name, cells, revokedAt }) => ({
    name,
    cells: cells.map((cell) => cell.name),
    isRevoked: revokedAt !== null,
  }));

describe("changeKiosk", () => {
  test("a kiosk moves from now on; before, it was where it was", () =>
    withDb(async (db) => {
      const scope = await withKiosk(db);
      const { id, cellIds } = scope;
      await changeKiosk(scope, { id, name: "Neck 2", cellId: cellIds.Neck }, hand(9));
      expect(await listed(scope, 9)).toEqual([
        { name: "Neck 2", cells: ["Neck"], isRevoked: false },
      ]);
      expect(await listed(scope, 8)).toMatchObject([{ cells: ["Mill"] }]);
      await changeKiosk(scope, { id, name: "Neck 3", cellId: null }, hand(10));
      expect(await listed(scope, 10)).toMatchObject([{ name: "Neck 3", cells: ["Neck"] }]);
    }));

  test("a revoked one, and one of another site, cannot be changed", () =>
    withDb(async (db) => {
      const scope = await withKiosk(db);
      const other = await makeFactory(db);
      const change = { id: scope.id, name: "X", cellId: null };
      expect(await changeKiosk(other, change, hand(9))).toMatchObject({
        problem: { code: "notFound" },
      });
      expect(await revokeKiosk(scope, scope.id, hand(9))).toEqual({ ok: true });
      expect(await changeKiosk(scope, change, hand(9))).toMatchObject({
        problem: { code: "notFound" },
      });
      expect(await listed(scope, 10)).toMatchObject([{ name: "Mill 1", isRevoked: true }]);
    }));
});

describe("addEnrolmentCode", () => {
  test("a form sent twice keeps one code, the one shown last, for ten minutes", () =>
    withDb(async (db) => {
      const scope = await withKiosk(db);
      const offer = { id: uuid(), name: "Mill 2", cellId: scope.cellIds.Mill, ...hand(9) };
      await addEnrolmentCode(scope, { ...offer, codeHash: "first" });
      const until = await addEnrolmentCode(scope, { ...offer, codeHash: "second" });
      expect(until).toEqual(new Date(at(9).getTime() + 600_000));
      const kept = await db.select({ codeHash: enrolmentCodes.codeHash }).from(enrolmentCodes);
      expect(kept).toEqual([{ codeHash: "second" }]);
    }));
});
