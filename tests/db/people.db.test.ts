import { v7 as uuid } from "uuid";
import { describe, expect, test } from "vitest";
import { reserveTry } from "@/db/access/commands";
import type { Db } from "@/db/client";
import { addWorker, changeWorker, setPin } from "@/db/people/commands";
import { findNextNumber, findWorker, listWorkers } from "@/db/people/queries";
import { workers } from "@/db/people/tables";
import type { WorkerForm } from "@/lib/people/schema";
import { makeFactory } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

const at = new Date("2026-05-14T08:00:00Z");
const pin = (hash: string) => ({ hash, at, by: "account:test" });
const everyone = { text: "", within: null, hereOn: null };
const page = { after: null, limit: 100 };

async function factoryWith(db: Db) {
  const factory = await makeFactory(db);
  const form = (fields: Partial<WorkerForm> = {}): WorkerForm => ({
    id: uuid(),
    number: "1050",
    name: "Oda Brekke",
    cell: factory.cellIds.Neck,
    language: "en",
    payrollNumber: null,
    endsOn: null,
    ...fields,
  });
  return { ...factory, form };
}

describe("addWorker", () => {
  test("a form sent twice adds one worker, whose PIN is the one shown last", () =>
    withDb(async (db) => {
      const { form, ...scope } = await factoryWith(db);
      const worker = form();
      expect(await addWorker(scope, worker, pin("first"))).toEqual({ ok: true });
      expect(await addWorker(scope, worker, pin("second"))).toEqual({ ok: true });
      const kept = await db.select({ id: workers.id, hash: workers.pinHash }).from(workers);
      expect(kept.filter(({ id }) => id === worker.id)).toEqual([
        { id: worker.id, hash: "second" },
      ]);
    }));

  test("a number that someone has is refused at its field", () =>
    withDb(async (db) => {
      const { form, ...scope } = await factoryWith(db);
      const refused = await addWorker(scope, form({ number: "1042" }), pin("x"));
      expect(refused).toMatchObject({
        ok: false,
        problem: { code: "conflict", errors: [{ path: "number", message: expect.any(String) }] },
      });
      expect(await findWorker(scope, "1050", null)).toBeNull();
    }));

  test("a payroll number is unique in the installation, across sites", () =>
    withDb(async (db) => {
      const { form, ...scope } = await factoryWith(db);
      const other = await factoryWith(db);
      await addWorker(scope, form({ payrollNumber: "P-7" }), pin("x"));
      const refused = await addWorker(other, other.form({ payrollNumber: "P-7" }), pin("x"));
      expect(refused).toMatchObject({ problem: { errors: [{ path: "payrollNumber" }] } });
    }));

  test("a cell of another site is no cell here", () =>
    withDb(async (db) => {
      const { form, ...scope } = await factoryWith(db);
      const other = await makeFactory(db);
      const refused = await addWorker(scope, form({ cell: other.cellIds.Neck }), pin("x"));
      expect(refused).toMatchObject({ problem: { errors: [{ path: "cell" }] } });
    }));
});

describe("changeWorker", () => {
  test("keeps the own number, and changes cell and last day", () =>
    withDb(async (db) => {
      const { form, workerId, cellIds, ...scope } = await factoryWith(db);
      const changed = form({ id: workerId, number: "1042", endsOn: "2026-05-31" });
      expect(await changeWorker(scope, changed, "account:test")).toEqual({ ok: true });
      expect(await findWorker(scope, "1042", null)).toMatchObject({
        name: "Oda Brekke",
        cell: "Neck",
        cellId: cellIds.Neck,
        endsOn: "2026-05-31",
      });
    }));

  test("a worker of another site is not found", () =>
    withDb(async (db) => {
      const { form, ...scope } = await factoryWith(db);
      const other = await factoryWith(db);
      const refused = await changeWorker(
        other,
        form({ id: scope.workerId, cell: other.cellIds.Mill }),
        "x",
      );
      expect(refused).toMatchObject({ problem: { code: "notFound" } });
    }));
});

describe("setPin", () => {
  test("gives the new PIN and forgets the wrong tries of this worker only", () =>
    withDb(async (db) => {
      const { workerId, ...scope } = await factoryWith(db);
      const key = `pin:${scope.siteId}:${workerId}:kiosk`;
      const other = `pin:${scope.siteId}:${uuid()}:kiosk`;
      const tried = { waitsSeconds: [60], now: at };
      await reserveTry(db, { key, ...tried });
      await reserveTry(db, { key: other, ...tried });
      await setPin(scope, workerId, pin("new"));
      expect(await reserveTry(db, { key, ...tried })).toBe(0);
      expect(await reserveTry(db, { key: other, ...tried })).toBe(60);
    }));
});

describe("listWorkers", () => {
  test("pages by name, also where two have the same", () =>
    withDb(async (db) => {
      const { form, ...scope } = await factoryWith(db);
      for (const number of ["1060", "1061", "1062"]) {
        await addWorker(scope, form({ number }), pin("x"));
      }
      const first = await listWorkers(scope, everyone, { after: null, limit: 2 });
      const second = await listWorkers(scope, everyone, {
        after: first.at(-1)!.number,
        limit: 9,
      });
      expect([...first, ...second].map(({ number }) => number)).toEqual([
        "1042",
        "1060",
        "1061",
        "1062",
      ]);
    }));

  test("finds by part of name or number, within cells, and leaves out who left", () =>
    withDb(async (db) => {
      const { form, cellIds, ...scope } = await factoryWith(db);
      await addWorker(scope, form({ endsOn: "2026-05-13", name: "100 % Oak" }), pin("x"));
      const found = async (filter: Partial<typeof everyone> | object) =>
        (await listWorkers(scope, { ...everyone, ...filter }, page)).map(({ number }) => number);
      expect(await found({ text: "oak" })).toEqual(["1050"]);
      expect(await found({ text: "105" })).toEqual(["1050"]);
      expect(await found({ text: "0 %" })).toEqual(["1050"]);
      expect(await found({ text: "%" })).toEqual(["1050"]);
      expect(await found({ within: [cellIds.Mill] })).toEqual(["1042"]);
      expect(await found({ within: [] })).toEqual([]);
      expect(await found({ hereOn: "2026-05-13" })).toEqual(["1050", "1042"]);
      expect(await found({ hereOn: "2026-05-14" })).toEqual(["1042"]);
    }));

  test("nobody of another site is listed", () =>
    withDb(async (db) => {
      await makeFactory(db);
      const other = await makeFactory(db);
      expect(await listWorkers(other, everyone, page)).toHaveLength(1);
    }));
});

describe("findWorker", () => {
  test("a lead finds no worker of another cell", () =>
    withDb(async (db) => {
      const { cellIds, ...scope } = await factoryWith(db);
      expect(await findWorker(scope, "1042", [cellIds.Neck])).toBeNull();
      expect(await findWorker(scope, "1042", [cellIds.Mill])).toMatchObject({ number: "1042" });
    }));
});

describe("findNextNumber", () => {
  test("is one more than the highest, and 1001 in an empty house", () =>
    withDb(async (db) => {
      const scope = await makeFactory(db);
      expect(await findNextNumber(scope)).toBe("1043");
      expect(await findNextNumber({ db, siteId: uuid() })).toBe("1001");
    }));
});
