import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { findSite } from "@/db/sites/queries";
import { findBirthRecord } from "@/db/tickets/birth-record";
import { reachOf } from "@/lib/access/may";
import { birthRecordOf } from "@/lib/api/birth-record";
import { assert } from "@/lib/assert";
import { decideTicketNumber } from "@/lib/codes/ticket-number";
import { no, ok } from "@/lib/result";

/** The birth record of a ticket, by its number as scanned or keyed. */
export const GET = handle(
  { actor: "key", may: "tickets.read" },
  async ({ actor, params, receivedAt }) => {
    const number = decideTicketNumber(params.code ?? "");
    if (!number.ok) return number;
    const scope = { db: database(), siteId: actor.siteId };
    const [site, life] = await Promise.all([findSite(scope), findBirthRecord(scope, number.value)]);
    if (!life) return no("notFound", `There is no ticket ${params.code} here.`);
    assert(site !== null, "a key belongs to a site");
    const mayName = reachOf(actor.held, "segments.name-people") === "site";
    const facts = { rules: site.rules, nowMs: receivedAt.getTime(), mayName };
    return ok(birthRecordOf(life, facts));
  },
);
