import type { Store } from "@/kiosk/store";
import type { Device } from "@/lib/bench/schema";
import type { Enrolled } from "@/lib/kiosks/schema";

/** Reads what this browser was enrolled as; null before enrolment. */
export async function findDevice(store: Store): Promise<Device | null> {
  return (await store.get("device", "device")) ?? null;
}

/**
 * Keeps what the server said at enrolment, and asks the browser not to clear this storage when
 * space runs short: records may wait in it.
 */
export async function keepEnrolment(store: Store, enrolled: Enrolled): Promise<Device> {
  const { serverTime: _, ...told } = enrolled;
  const device: Device = { ...told, muted: false };
  await store.put("device", device, "device");
  await navigator.storage?.persist?.();
  return device;
}

/** Changes what is kept of the device: its sounds, or the key with which it seals. */
export async function changeDevice(store: Store, change: Partial<Device>): Promise<Device | null> {
  const tx = store.transaction("device", "readwrite");
  const device = await tx.store.get("device");
  const changed = device ? { ...device, ...change } : null;
  if (changed) await tx.store.put(changed, "device");
  await tx.done;
  return changed;
}
