import { Temporal } from "temporal-polyfill";
import { correctedOffset } from "@/lib/time/corrections";

/** Says whether the text names a zone of the IANA database that this run-time knows. */
export function isTimeZone(text: string): boolean {
  try {
    return new Intl.DateTimeFormat("en", { timeZone: text }).resolvedOptions().timeZone !== "";
  } catch {
    return false; // Intl has no other way to say no
  }
}

/**
 * Names the tz database release that the run-time brings, such as "2025c"; null where it does not
 * tell (browsers). `zoneCorrections` lists what is put right on top of it.
 */
export function zoneDataRelease(): string | null {
  return globalThis.process?.versions?.tz ?? null;
}

/**
 * What a wall clock in the zone shows at an instant, to the millisecond and without an offset.
 *
 * @param atMs epoch milliseconds
 * @throws RangeError when the run-time does not know the zone
 */
export function wallClock(atMs: number, zone: string): Temporal.PlainDateTime {
  return Temporal.Instant.fromEpochMilliseconds(atMs)
    .toZonedDateTimeISO(zoneAt(atMs, zone))
    .toPlainDateTime();
}

/** The zone's offset from UTC at an instant, in milliseconds; east is positive. */
export function offsetMs(atMs: number, zone: string): number {
  const instant = Temporal.Instant.fromEpochMilliseconds(atMs);
  return instant.toZonedDateTimeISO(zoneAt(atMs, zone)).offsetNanoseconds / 1_000_000;
}

/** Reads local wall time as if it were UTC: the base on which offsets are taken. */
export function utcMs(local: Temporal.PlainDateTime): number {
  return local.toZonedDateTime("UTC").epochMilliseconds;
}

/** The zone itself, or the fixed offset that a correction puts in its place at that instant. */
function zoneAt(atMs: number, zone: string): string {
  return correctedOffset(atMs, zone) ?? zone;
}
