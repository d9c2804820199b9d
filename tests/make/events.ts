import type { EventBody } from "@/lib/ledger/schema";
import type { FoldFacts, LedgerEvent, SiteRules } from "@/lib/timeline/schema";

/** A readable id that is a UUID: `eventId(7)` ends in 7. */
export function eventId(number: number): string {
  return `00000000-0000-4000-8000-${String(number).padStart(12, "0")}`;
}

/** An event as the fold reads it, tapped by the worker at the kiosk "east" and received at once. */
export function makeEvent(
  number: number,
  atMs: number,
  body: EventBody,
  other: Partial<LedgerEvent> = {},
): LedgerEvent {
  const { items } = body as { items?: readonly unknown[] };
  return {
    id: eventId(number),
    atMs,
    seq: number,
    kiosk: "east",
    session: eventId(0),
    cell: "east",
    by: null,
    receivedMs: atMs + 1000,
    weights: (items ?? []).map(() => 1),
    questions: [],
    body,
    ...other,
  };
}

/** Rules of a site in UTC: limit 14 h, rest between shifts 11 h, since 30 min, breaks 20 and 75 min. */
export const siteRules: SiteRules = {
  fromMs: 0,
  timeZone: "UTC",
  productionDayStartsAtMinutes: 0,
  shiftLimitSeconds: 14 * 3600,
  sinceLimitSeconds: 1800,
  restMaxSeconds: 1200,
  mealMaxSeconds: 4500,
  restBetweenShiftsSeconds: 11 * 3600,
};

/** Facts of a worker of the cell "home" without a plan. */
export const foldFacts: FoldFacts = { rules: [siteRules], planned: [], homeCell: "home" };
