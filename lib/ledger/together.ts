import type { ServedCell } from "@/lib/ledger/act-cell";
import type { KnownSession } from "@/lib/ledger/admit";
import type { Asked } from "@/lib/ledger/asked";
import type { BookingContext } from "@/lib/ledger/context";
import type { DecidedBooking } from "@/lib/ledger/decide-booking";

/** What is asked for several batches at once; kiosks name those that ask. */
export type AskedTogether = Omit<Asked, "kioskId"> & { kioskIds: string[] };

/** What was read for several batches at once: what is a kiosk's own names its kiosk. */
export type ReadTogether = Omit<BookingContext, "sessions" | "served" | "next"> & {
  sessions: (KnownSession & { kioskId: string })[];
  served: (ServedCell & { kioskId: string })[];
  next: ReadonlyMap<string, BookingContext["next"]>;
};

/** Puts together what several batches ask; the latest instant at which a bench is wanted counts. */
export function askedTogether(all: readonly Asked[]): AskedTogether {
  const benches = all.flatMap(({ benchAtMs }) => benchAtMs ?? []);
  return {
    kioskIds: [...new Set(all.flatMap(({ kioskId }) => kioskId ?? []))],
    numbers: [...new Set(all.flatMap(numbersOf))],
    sessions: [...new Set(all.flatMap(({ sessions }) => sessions))],
    ids: all.flatMap(({ ids }) => ids),
    touched: all.flatMap(({ touched }) => touched),
    targets: all.flatMap(({ targets }) => targets),
    items: all.flatMap(({ items }) => items),
    benchAtMs: benches.length > 0 ? Math.max(...benches) : null,
  };
}

/** Whoever is named, and whose timeline is touched. */
function numbersOf({ numbers, touched }: Asked): string[] {
  return [...numbers, ...touched.map(({ number }) => number)];
}

/** One batch's part of what was read for several: its kiosk's sessions, its people's timelines. */
export function ownContext(read: ReadTogether, asked: Asked): BookingContext {
  const isOwn = ({ kioskId }: { kioskId: string }) => kioskId === asked.kioskId;
  const isAsked = ({ id }: { id: string }) => asked.sessions.includes(id);
  const sessions = read.sessions.filter((session) => isOwn(session) && isAsked(session));
  const numbers = new Set(numbersOf(asked));
  const people = new Set([
    ...read.workers.flatMap(({ id, number }) => (numbers.has(number) ? id : [])),
    ...sessions.map(({ workerId }) => workerId),
  ]);
  return {
    ...read,
    sessions,
    served: read.served.filter(isOwn),
    windows: read.windows.filter(({ workerId }) => people.has(workerId)),
    next: read.next.get(asked.kioskId ?? "") ?? [],
  };
}

/**
 * Says of each of several decided batches whether it can be written together with those before it:
 * not where one of them writes the same timeline or record, or comes from the same kiosk, as it was
 * decided without knowing of that. The first always can.
 */
export function fitTogether(
  decided: readonly (Pick<DecidedBooking, "timelines" | "rows"> & { kioskId: string | null })[],
): boolean[] {
  const taken = new Set<string>();
  return decided.map(({ kioskId, timelines, rows }) => {
    const writes = [
      `kiosk ${kioskId}`,
      ...timelines.flatMap(({ workerId, isTouched }) => (isTouched ? `worker ${workerId}` : [])),
      ...rows.map(({ id }) => `record ${id}`),
    ];
    if (writes.some((one) => taken.has(one))) return false;
    for (const one of writes) taken.add(one);
    return true;
  });
}
