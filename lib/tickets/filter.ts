import { z } from "zod";

const name = z.string().max(200).catch("");

/** What the address says of the list of tickets; anything odd in it counts as not said. */
export const ticketsFilter = z.object({
  q: z.string().trim().max(40).catch(""),
  status: z.enum(["open", "finished", "scrapped", "cancelled", "all"]).catch("open"),
  model: name,
  cell: name,
  after: z.coerce.number().int().min(1).optional().catch(undefined),
});
export type TicketsFilter = z.infer<typeof ticketsFilter>;
