import { offsetMs } from "@/lib/time/zone";

/**
 * An instant as RFC 3339 with the offset that the zone has then, to the whole second:
 * "2026-03-01T00:00:00-08:00". Offsets are whole minutes since 1972, as the format wants them.
 *
 * @param atSecond epoch seconds
 */
export function zonedText(atSecond: number, zone: string): string {
  const offsetMinutes = Math.round(offsetMs(atSecond * 1000, zone) / 60_000);
  const local = new Date((atSecond + offsetMinutes * 60) * 1000).toISOString().slice(0, 19);
  const [hours, minutes] = [Math.floor(Math.abs(offsetMinutes) / 60), Math.abs(offsetMinutes) % 60];
  const two = (number: number) => String(number).padStart(2, "0");
  return `${local}${offsetMinutes < 0 ? "-" : "+"}${two(hours)}:${two(minutes)}`;
}
