import type { ReceivedRecord } from "@/lib/ledger/decide";
import { effectMs } from "@/lib/ledger/place";
import { actOf, namedItems, targetOf } from "@/lib/ledger/target";

/** What a booking, a bench or a rebuild must know of the ledger. */
export interface Asked {
  kioskId: string | null;
  /** Numbers of workers who are named. */
  numbers: readonly string[];
  sessions: readonly string[];
  /** The ids under which the records of a batch may be known. */
  ids: readonly string[];
  /** Whose timeline is touched, and when. */
  touched: readonly { number: string; atMs: number }[];
  /** Events that corrections of the batch are about. */
  targets: readonly string[];
  items: readonly { ticket: string; operation: string }[];
  /** Where a bench is wanted, the instant that it shows; null where none is. */
  benchAtMs: number | null;
}

/** Lists what must be known to book a batch: its people, its proof, what it touches and names. */
export function askedBy(
  records: readonly ReceivedRecord[],
  batch: { kioskId: string; proved: readonly { worker: string }[]; benchAtMs: number | null },
): Asked {
  const readable = records.flatMap((record) => record.readable ?? []);
  const events = readable.map(({ event }) => event);
  const authors = events.flatMap(({ worker, by }) => (by === undefined ? [worker] : [worker, by]));
  const instants = readable.flatMap(({ event, placed }) =>
    [placed.atMs, effectMs(event), batch.benchAtMs].flatMap((atMs) =>
      atMs === null ? [] : { number: event.worker, atMs },
    ),
  );
  return {
    kioskId: batch.kioskId,
    numbers: [...new Set([...authors, ...batch.proved.map(({ worker }) => worker)])],
    sessions: [...new Set(events.map(({ session }) => session))],
    ids: records.flatMap(({ id, clashId }) => [id, clashId]),
    touched: instants,
    targets: events.flatMap((event) => targetOf(event) ?? []),
    items: events.flatMap((event) => [...namedItems(actOf(event))]),
    benchAtMs: batch.benchAtMs,
  };
}
