import { type DBSchema, type IDBPDatabase, openDB } from "idb";
import type { BenchSession, Device } from "@/lib/bench/schema";
import type { Bench, KioskCell } from "@/lib/kiosks/schema";
import type { ClockEvent } from "@/lib/ledger/schema";

/** A record that waits to be handed in. `order` is the order of the acts on this kiosk. */
export interface Waiting {
  order?: number;
  event: ClockEvent;
  /** Set when the server could not take it even alone: kept, and tried again at the next start. */
  asideMs?: number;
}

/** The last bench that the server sent for a worker. */
export interface KeptBench {
  worker: string;
  bench: Bench;
  receivedMs: number;
}

/** The cell as the server last told it, with its `ETag`. */
export interface KeptCell {
  etag: string | null;
  cell: KioskCell;
  receivedMs: number;
}

interface KioskSchema extends DBSchema {
  outbox: { key: number; value: Waiting; indexes: { id: string } };
  sessions: { key: string; value: BenchSession };
  benches: { key: string; value: KeptBench };
  device: { key: "device"; value: Device };
  cell: { key: "cell"; value: KeptCell };
  counters: { key: "seq"; value: number };
}

export type Store = IDBPDatabase<KioskSchema>;

const STORE_NAME = "bookmatch-kiosk";
const STORE_VERSION = 1;

/**
 * Opens what the kiosk keeps in this browser. A newer page in another tab may upgrade it: this one
 * then closes its hold and says so, and the page must be loaded again.
 */
export function openStore(onLost: () => void, name = STORE_NAME): Promise<Store> {
  return openDB<KioskSchema>(name, STORE_VERSION, {
    upgrade(db) {
      const outbox = db.createObjectStore("outbox", { keyPath: "order", autoIncrement: true });
      outbox.createIndex("id", "event.id", { unique: true });
      db.createObjectStore("sessions", { keyPath: "session" });
      db.createObjectStore("benches", { keyPath: "worker" });
      db.createObjectStore("device");
      db.createObjectStore("cell");
      db.createObjectStore("counters");
    },
    blocking(_current, _blocked, event) {
      // safe because the event's target is the connection that stands in the way
      (event.target as IDBDatabase).close();
      onLost();
    },
    terminated: onLost,
  });
}
