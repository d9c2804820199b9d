import type { KeptBench, KeptCell, Store } from "@/kiosk/store";
import type { Bench, KioskCell } from "@/lib/kiosks/schema";

/** Keeps the last bench of a worker, so that a badge opens it again while the server is away. */
export async function keepBench(
  store: Store,
  worker: string,
  bench: Bench,
  receivedMs: number,
): Promise<void> {
  await store.put("benches", { worker, bench, receivedMs });
}

/** Lists the benches kept, for the start of the page. */
export function listBenches(store: Store): Promise<KeptBench[]> {
  return store.getAll("benches");
}

/** Keeps the cell as the server told it, with its `ETag`. */
export async function keepCell(
  store: Store,
  cell: KioskCell,
  etag: string | null,
  receivedMs: number,
): Promise<void> {
  await store.put("cell", { cell, etag, receivedMs }, "cell");
}

/** Reads the cell kept; null before it was ever told. */
export async function findCell(store: Store): Promise<KeptCell | null> {
  return (await store.get("cell", "cell")) ?? null;
}
