import { describe, expect, test } from "vitest";
import { listStandardsOnPage } from "@/db/standards/queries";
import { findTicketChoices } from "@/db/tickets/choices";
import { listProgressOnPage } from "@/db/tickets/progress";
import { listTickets } from "@/db/tickets/queries";
import { makeFactory, makeTicket } from "@/tests/make/factory";
import { withDb } from "@/tests/setup/db";

describe("a page of tickets", () => {
  test("brings the operations and standards of its own tickets, whatever the filter", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      const first = await makeTicket(factory, { number: "26000010", finished: 1 });
      await makeTicket(factory, { number: "26000022", status: "finished", finished: 3 });
      const wanted = { status: "open" as const, cell: "Neck", limit: 10 };
      expect((await listTickets(factory, wanted)).map(({ id }) => id)).toEqual([first]);
      const progress = await listProgressOnPage(factory, wanted);
      expect(
        progress.map(({ ticketId, operation, state }) => [ticketId, operation, state]),
      ).toEqual([
        [first, "010", "finished"],
        [first, "020", "ready"],
        [first, "030", "ready"],
      ]);
      expect(await listStandardsOnPage(factory, wanted)).toMatchObject([
        { modelId: factory.modelId, operation: "010", setupSeconds: 600 },
      ]);
      expect(await listProgressOnPage(factory, { ...wanted, cell: "Mill" })).toEqual([]);
    }));

  test("part of a ticket's or an order's number finds it; what SQL would match does not", () =>
    withDb(async (db) => {
      const factory = await makeFactory(db);
      await makeTicket(factory, { number: "26000010" });
      const found = async (text: string) =>
        (await listTickets(factory, { text, limit: 10 })).map(({ number }) => number);
      expect(await found("26-0000")).toEqual(["26000010"]);
      expect(await found("0001")).toEqual(["26000010"]);
      expect(await found("1001")).toEqual(["26000010"]);
      expect(await found("26_0001")).toEqual([]);
      expect(await found("%")).toEqual([]);
    }));

  test("models and cells to choose from are those of the site", () =>
    withDb(async (db) => {
      await makeFactory(db);
      const factory = await makeFactory(db);
      expect(await findTicketChoices(factory)).toEqual({
        models: ["Heron"],
        cells: ["Mill", "Neck", "Spray"],
      });
    }));
});
