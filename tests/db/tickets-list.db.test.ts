import { describe, expect, test } from "vitest";
import type { Db } from "@/db/client";
import { listTickets, type TicketsWanted } from "@/db/tickets/queries";
import { makeFactory, makeTicket } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

/** Five tickets at one site, and one of another site that must never show. */
async function listed(db: Db, wanted: Partial<TicketsWanted>) {
  const factory = await makeFactory(db);
  await makeTicket(factory, { number: "26000010", withOption: true });
  await makeTicket(factory, { number: "26000029", finished: 1 });
  await makeTicket(factory, { number: "26000032", finished: 2 });
  await makeTicket(factory, { number: "26000041", finished: 3, status: "finished" });
  await makeTicket(factory, { number: "26000055", finished: 1, status: "cancelled" });
  await makeTicket(await makeFactory(db), { number: "26000010" });
  return listTickets({ db, siteId: factory.siteId }, { limit: 100, ...wanted });
}

const numbers = (wanted: Partial<TicketsWanted>) =>
  withDb(async (db) => (await listed(db, wanted)).map(({ number }) => number));

describe("listTickets", () => {
  test("tells of each ticket what it is and where its next operation is", async () => {
    const [first, , , finished, cancelled] = await withDb((db) => listed(db, {}));
    expect(first).toMatchObject({
      number: "26000010",
      status: "open",
      model: "Heron",
      options: ["Sunburst"],
      order: "1001",
      quantity: 1,
      operation: "010",
      operationName: "Mill work",
      stage: "Mill",
      cell: "Mill",
    });
    expect(finished).toMatchObject({ options: [], operation: null, cell: null });
    expect(cancelled).toMatchObject({ operation: null, operationName: null, cell: null });
  });
  test.each([
    [{}, ["26000010", "26000029", "26000032", "26000041", "26000055"]],
    [{ status: "open" as const }, ["26000010", "26000029", "26000032"]],
    [{ cell: "Neck" }, ["26000029"]],
    [{ cell: "Nowhere" }, []],
    [{ cell: "Neck", status: "cancelled" as const }, []],
    [{ model: "Heron", limit: 2 }, ["26000010", "26000029"]],
    [{ model: "Wren" }, []],
    [{ number: "26000032" }, ["26000032"]],
  ])("%j lists %j", async (wanted, expected) => {
    expect(await numbers(wanted)).toEqual(expected);
  });
  test("goes on after the last ticket of the page before", async () => {
    const rest = await withDb(async (db) => {
      const factory = await makeFactory(db);
      for (const number of ["26000010", "26000029", "26000032"]) {
        await makeTicket(factory, { number });
      }
      const [, second] = await listTickets(factory, { limit: 2 });
      return listTickets(factory, { limit: 2, after: second!.seq });
    });
    expect(rest.map(({ number }) => number)).toEqual(["26000032"]);
  });
});
