import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { findServedCells } from "@/db/kiosks/cell";
import { findSite } from "@/db/sites/queries";
import { listSteppedBooks } from "@/db/tickets/steps";
import { decideTicketNumber } from "@/lib/codes/ticket-number";
import { kioskTicketOf } from "@/lib/kiosks/ticket-view";
import { no, ok } from "@/lib/result";

/**
 * A ticket as scanned or keyed, with its operations and what stands in their way here. Judged anew
 * from all that is booked to it, so that it is fresh right after a booking.
 */
export const GET = handle({ actor: "worker" }, async ({ actor, params, receivedAt }) => {
  const number = decideTicketNumber(params.code ?? "");
  if (!number.ok) return number;
  const scope = { db: database(), siteId: actor.siteId };
  const [site, { cells }, [found]] = await Promise.all([
    findSite(scope),
    findServedCells(scope, actor.kioskId, receivedAt),
    listSteppedBooks(scope, [number.value]),
  ]);
  const from = {
    cells: cells.map(({ id }) => id),
    rules: site?.rules ?? [],
    atMs: receivedAt.getTime(),
  };
  const ticket = found ? kioskTicketOf(found.book, from, found.steps) : null;
  return ticket ? ok(ticket) : no("notFound", `There is no ticket ${number.value} here.`);
});
