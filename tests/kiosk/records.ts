import type { Draft } from "@/kiosk/outbox";

/** A record as a tap makes it; `n` numbers it. */
export function draft(n: number, change: Partial<Draft> = {}): Draft {
  return {
    id: uuidOf(n),
    v: 1,
    kind: "shift-start",
    session: uuidOf(9000),
    worker: "1042",
    at: new Date(Date.UTC(2026, 4, 14, 7, 0, n)).toISOString(),
    clock: { offsetMs: 0, uncertaintyMs: 20, boot: "boot-1", monotonicMs: n * 1000 },
    ...change,
  } as Draft; // safe because every change in these tests is of one kind's own fields
}

/** A UUID with a number in it, so that a failure is easy to read. */
export function uuidOf(n: number): string {
  return `018f7000-0000-7000-8000-${String(n).padStart(12, "0")}`;
}
