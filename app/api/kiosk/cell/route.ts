import { createHash } from "node:crypto";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { findServedCells, listCellPeople, listCellQueue } from "@/db/kiosks/cell";
import { findSite } from "@/db/sites/queries";
import { listSteppedBooks } from "@/db/tickets/steps";
import type { KioskCell } from "@/lib/kiosks/schema";
import { kioskTicketOf } from "@/lib/kiosks/ticket-view";
import { otherWorkCodes } from "@/lib/ledger/other-work";
import { no } from "@/lib/result";
import { localDate, ruleAt } from "@/lib/time/site-day";

/**
 * What a kiosk keeps of its cells, so that a scan needs no request: people, queue, whole tickets.
 * Answers 304 while nothing changed; time that runs is left out, or it would change every second.
 */
export const GET = handle({ actor: "kiosk" }, async ({ actor, request, receivedAt }) => {
  if (actor.revokedAt) return no("forbidden", "This tablet was taken out of use. Use another one.");
  const scope = { db: database(), siteId: actor.siteId };
  const [site, served] = await Promise.all([
    findSite(scope),
    findServedCells(scope, actor.kioskId, receivedAt),
  ]);
  if (!site) throw new Error(`site ${actor.siteId} has a kiosk and is not there`);
  const atMs = receivedAt.getTime();
  const { fromMs, ...rules } = ruleAt(site.rules, atMs);
  const cellIds = served.cells.map(({ id }) => id);
  const today = localDate(atMs, rules.timeZone);
  const [people, queue] = await Promise.all([
    listCellPeople(scope, { cellIds, today }),
    listCellQueue(scope, cellIds),
  ]);
  const booked = await listSteppedBooks(scope, [...new Set(queue.map(({ ticket }) => ticket))]);
  const from = { cells: cellIds, rules: site.rules, atMs, isToKeep: true };
  const cell: KioskCell = {
    kiosk: { deviceId: actor.kioskId, name: served.kiosk },
    site: { id: actor.siteId, name: site.name, timeZone: rules.timeZone, locale: site.locale },
    cells: served.cells.map(({ name }) => name),
    rules,
    people: people.map(({ inSince, ...person }) => ({
      ...person,
      inSince: inSince?.toISOString() ?? null,
      qualifications: [],
    })),
    tickets: booked.flatMap(({ book, steps }) => kioskTicketOf(book, from, steps) ?? []),
    queue,
    otherWork: [...otherWorkCodes],
    notes: [],
  };
  return answerUnlessKnown(JSON.stringify(cell), request);
});

function answerUnlessKnown(body: string, request: Request): Response {
  const etag = `"${createHash("sha256").update(body).digest("base64url")}"`;
  const headers = { etag, "cache-control": "private, no-cache" };
  const known = (request.headers.get("if-none-match") ?? "").split(/\s*,\s*/);
  if (known.some((tag) => tag.replace(/^W\//, "") === etag)) {
    return new Response(null, { status: 304, headers });
  }
  return new Response(body, { headers: { ...headers, "content-type": "application/json" } });
}
