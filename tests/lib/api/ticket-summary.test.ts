import { expect, test } from "vitest";
import { ticketSummaryOf } from "@/lib/api/ticket-summary";
import { ticketSummary } from "@/lib/api/tickets";

test("ticketSummaryOf shows what the contract names and nothing else of the row", () => {
  const row = {
    seq: 7,
    id: "a row's own",
    number: "26048176",
    status: "open" as const,
    model: "Heron",
    options: ["Sunburst"],
    order: null,
    quantity: 4,
    dueOn: "2026-06-01",
    operation: "010",
    operationName: "Mill work",
    stage: "Mill",
    cell: "Mill",
    createdAt: new Date("2026-05-14T09:42:00Z"),
    finishedAt: null,
  };
  const summary = ticketSummaryOf(row);
  expect(summary).toMatchObject({
    ticket: "26048176",
    createdAt: "2026-05-14T09:42:00.000Z",
    finishedAt: null,
  });
  expect(ticketSummary.strict().parse(summary)).toEqual(summary);
  expect(ticketSummaryOf({ ...row, finishedAt: row.createdAt }).finishedAt).toBe(summary.createdAt);
});
