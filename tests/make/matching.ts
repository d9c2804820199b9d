import { type PartsFacts, ticketParts } from "@/lib/matching/ticket-parts";
import type { TicketBook } from "@/lib/tickets/book";
import { makeBook } from "@/tests/make/book";
import { siteRules } from "@/tests/make/events";

/** Days of UTC, no operation whose setup is earned when booked, nobody who shares time. */
export const matchingFacts: PartsFacts = {
  rules: [{ ...siteRules, timeZone: "UTC", productionDayStartsAtMinutes: 0 }],
  whenBooked: new Set(),
  sharesOf: () => null,
  rivals: [],
};

/** The parts of ticket 26000017 with some records; its operations are 010 in mill, 020 in neck. */
export function makeParts(records: Partial<TicketBook>, facts: Partial<PartsFacts> = {}) {
  return ticketParts(makeBook(records), { ...matchingFacts, ...facts });
}
