import { z } from "zod";
import { afterSeq, sought } from "@/lib/forms";

const name = sought(200);

/** What the address says of the list of tickets; anything odd in it counts as not said. */
export const ticketsFilter = z.object({
  q: sought(40),
  status: z.enum(["open", "finished", "scrapped", "cancelled", "all"]).catch("open"),
  model: name,
  cell: name,
  after: afterSeq.optional().catch(undefined),
});
export type TicketsFilter = z.infer<typeof ticketsFilter>;
