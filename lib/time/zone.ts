import { Temporal } from "temporal-polyfill";

/**
 * Rules that are younger than the zone data of a run-time may be: from `fromMs` on the zone keeps
 * one offset. Where the run-time's data is newer, the answer is the same, so an entry does no harm.
 * Source: tz database 2026b (British Columbia) and 2026c (Alberta, Morocco).
 */
export const zoneCorrections = [
  {
    zones: ["America/Vancouver", "Canada/Pacific"],
    fromMs: Date.parse("2026-11-01T09:00:00Z"),
    offset: "-07:00",
    release: "2026b",
  },
  {
    zones: ["America/Edmonton", "America/Yellowknife", "Canada/Mountain"],
    fromMs: Date.parse("2026-11-01T08:00:00Z"),
    offset: "-06:00",
    release: "2026c",
  },
  {
    zones: ["Africa/Casablanca", "Africa/El_Aaiun"],
    fromMs: Date.parse("2026-09-20T01:00:00Z"),
    offset: "+00:00",
    release: "2026c",
  },
] as const;

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
  const name = zone.toLowerCase(); // zone names are the same in any case
  const correction = zoneCorrections.find(
    ({ zones, fromMs }) => atMs >= fromMs && zones.some((one) => one.toLowerCase() === name),
  );
  return correction?.offset ?? zone;
}
