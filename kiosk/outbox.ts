import type { Store, Waiting } from "@/kiosk/store";
import type { EventResult } from "@/lib/kiosks/schema";
import type { Clock, ClockEvent } from "@/lib/ledger/schema";

/** An event before it has its place in the kiosk's order. */
export type Draft = ClockEvent extends infer E
  ? E extends ClockEvent
    ? Omit<E, "clock"> & { clock: Omit<Clock, "seq"> }
    : never
  : never;

/** An event and the server's word on it. */
export interface Settled {
  event: ClockEvent;
  result: EventResult;
}

/** The records that this kiosk keeps until the server has answered for each of them. */
export interface Outbox {
  /**
   * Keeps records in one transaction that is on the disk when the promise resolves, and numbers
   * them in the kiosk's order. A record that is kept already is left as it is.
   */
  add(drafts: readonly Draft[]): Promise<ClockEvent[]>;
  /** The oldest records first, at most `limit`; those set aside only on request. */
  oldest(limit: number, withAside?: boolean): Promise<ClockEvent[]>;
  /** Lets go of the records that the server has given a verdict on, and of no other. */
  settle(settled: readonly Settled[]): Promise<void>;
  /** Marks a record that the server cannot take even alone, so that it blocks no other. */
  setAside(id: string, atMs: number): Promise<void>;
  /** Takes everything set aside back into the row: at each start of the kiosk. */
  takeBack(): Promise<void>;
  /** How many records wait, with those set aside. */
  count(): Promise<number>;
}

/** Makes the outbox over the kiosk's store. */
export function openOutbox(store: Store): Outbox {
  return {
    add: (drafts) => addRecords(store, drafts),
    oldest: (limit, withAside = false) => listOldest(store, limit, withAside),
    settle: (settled) => removeRecords(store, settled),
    setAside: (id, atMs) => markRecord(store, id, (kept) => ({ ...kept, asideMs: atMs })),
    takeBack: () => takeBack(store),
    count: () => store.count("outbox"),
  };
}

async function addRecords(store: Store, drafts: readonly Draft[]): Promise<ClockEvent[]> {
  const tx = store.transaction(["outbox", "counters"], "readwrite", { durability: "strict" });
  const events: ClockEvent[] = [];
  try {
    let seq = (await tx.objectStore("counters").get("seq")) ?? 0;
    for (const draft of drafts) {
      const kept = await tx.objectStore("outbox").index("id").get(draft.id);
      seq += 1;
      const event = { ...draft, clock: { ...draft.clock, seq } } as ClockEvent; // safe: it lacked seq
      events.push(kept?.event ?? event);
      if (!kept) await tx.objectStore("outbox").add({ event });
    }
    await tx.objectStore("counters").put(seq, "seq");
  } catch (error) {
    // A transaction left alone commits what it has: one act is all there or not at all.
    tx.done.catch(() => undefined);
    tx.abort();
    throw error;
  }
  await tx.done;
  return events;
}

async function listOldest(store: Store, limit: number, withAside: boolean): Promise<ClockEvent[]> {
  const kept = await store.getAll("outbox");
  const wanted = withAside ? kept : kept.filter(({ asideMs }) => asideMs === undefined);
  return wanted.slice(0, limit).map(({ event }) => event);
}

async function removeRecords(store: Store, settled: readonly Settled[]): Promise<void> {
  const tx = store.transaction("outbox", "readwrite", { durability: "strict" });
  for (const { event } of settled) {
    const order = await tx.store.index("id").getKey(event.id);
    if (order !== undefined) await tx.store.delete(order);
  }
  await tx.done;
}

async function markRecord(store: Store, id: string, change: (kept: Waiting) => Waiting) {
  const tx = store.transaction("outbox", "readwrite");
  const kept = await tx.store.index("id").get(id);
  if (kept) await tx.store.put(change(kept));
  await tx.done;
}

async function takeBack(store: Store): Promise<void> {
  const tx = store.transaction("outbox", "readwrite");
  for (const { asideMs, ...kept } of await tx.store.getAll()) {
    if (asideMs !== undefined) await tx.store.put(kept);
  }
  await tx.done;
}
