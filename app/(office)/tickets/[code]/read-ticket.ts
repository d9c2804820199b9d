import { notFound } from "next/navigation";
import { siteOf } from "@/app/_server/site";
import type { Scope } from "@/db/client";
import { findBirthRecord } from "@/db/tickets/birth-record";
import { birthRecordOf } from "@/lib/api/birth-record";
import { decideTicketNumber } from "@/lib/codes/ticket-number";

/** Reads a ticket by what stands in the address, people named; 404 where there is none. */
export async function readTicket(scope: Scope, code: string, now: Date) {
  const number = decideTicketNumber(decodeURIComponent(code));
  if (!number.ok) notFound();
  const [site, life] = await Promise.all([
    siteOf(scope.siteId),
    findBirthRecord(scope, number.value),
  ]);
  if (!life) notFound();
  const facts = { rules: site.rules, nowMs: now.getTime(), mayName: true };
  return { site, record: birthRecordOf(life, facts) };
}
