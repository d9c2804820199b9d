import type { ClockEvent, EventBody, Item } from "@/lib/ledger/schema";

const UUID = /[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** The event that a correction is about: the settled subject's too; null for every other kind. */
export function targetOf(body: EventBody): string | null {
  switch (body.kind) {
    case "undo":
    case "void":
    case "move":
    case "reassign":
      return body.event;
    case "settle":
      return UUID.exec(body.end)?.[0] ?? null;
    default:
      return null;
  }
}

/** The act that an event is about: of an `insert` the inserted one, else the event itself. */
export function actOf(event: ClockEvent): ClockEvent {
  // safe because an inserted event was read as a whole one
  return event.kind === "insert" ? (event.event as ClockEvent) : event;
}

/** The ticket operations that an act shares time among: of `work` and `reassign`; may be empty. */
export function sharedItems(body: EventBody): readonly Item[] {
  return body.kind === "work" || body.kind === "reassign" ? (body.items ?? []) : [];
}

/** Every ticket operation that an act names; may be empty. */
export function namedItems(body: EventBody): readonly Item[] {
  if ("ticket" in body && "operation" in body) {
    return [{ ticket: body.ticket, operation: body.operation }];
  }
  return body.kind === "pause" ? body.items : sharedItems(body);
}

/**
 * The tickets of the act that a correction is about in the end: an answer to a ticket's question, or
 * the void of such an answer, lets that ticket be judged again. Empty where the act is not at hand.
 *
 * @param events those at hand, by id
 */
export function ticketsAbout(
  target: string | null,
  events: ReadonlyMap<string, EventBody>,
  seen: ReadonlySet<string> = new Set(),
): string[] {
  const body = target === null || seen.has(target) ? undefined : events.get(target);
  if (!body || target === null) return [];
  const tickets = namedItems(body).map(({ ticket }) => ticket);
  return [...tickets, ...ticketsAbout(targetOf(body), events, new Set([...seen, target]))];
}
