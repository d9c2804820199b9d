const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;

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

/** The fixed offset, "-07:00", that stands in for a zone's own rules at an instant; else null. */
export function correctedOffset(atMs: number, zone: string): string | null {
  const name = zone.toLowerCase(); // zone names are the same in any case
  const correction = zoneCorrections.find(
    ({ zones, fromMs }) => atMs >= fromMs && zones.some((one) => one.toLowerCase() === name),
  );
  return correction?.offset ?? null;
}

/** An offset such as "-07:00" in milliseconds; east is positive. */
export function writtenOffsetMs(offset: string): number {
  const [hours = 0, minutes = 0] = offset.slice(1).split(":").map(Number);
  const length = hours * HOUR_MS + minutes * MINUTE_MS;
  return offset.startsWith("-") ? -length : length;
}
