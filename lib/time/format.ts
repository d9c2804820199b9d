import { assert } from "@/lib/assert";
import { sum } from "@/lib/sum";
import { correctedOffset, writtenOffsetMs } from "@/lib/time/corrections";

/** A hundredth of an hour. */
const HUNDREDTH_SECONDS = 36;

/** Hours as decimal texts with two places; the parts add up to the total. */
export interface DecimalHours {
  total: string;
  parts: string[];
}

/**
 * Writes lengths as decimal hours so that the column adds up (CALCULATIONS.md 4): the total is
 * rounded once, half up on exact seconds; then each part gets its floor, and the hundredths left
 * over go to the largest fractions, ties to the earlier part. A part of 0 seconds stays 0.00.
 *
 * @param parts integer seconds, 0 or more; may be empty
 */
export function decimalHours(parts: readonly number[]): DecimalHours {
  const total = roundedHundredths(sum(parts));
  return { total: hoursText(total), parts: shareHundredths(total, parts).map(hoursText) };
}

/**
 * Shares a total of hundredths of an hour among lengths, by their floors and largest fractions. The
 * total is theirs rounded up or down, once, so that parts of parts add up as well.
 *
 * @param total whole hundredths: not less than the floors of `parts`
 * @param parts integer seconds, 0 or more; may be empty
 * @returns whole hundredths in the order of `parts`; they sum to `total`
 */
export function shareHundredths(total: number, parts: readonly number[]): number[] {
  assert(
    parts.every((part) => Number.isInteger(part) && part >= 0),
    "decimalHours: whole seconds, 0 or more",
  );
  const shares = parts.map((part) => Math.floor(part / HUNDREDTH_SECONDS));
  const byFraction = parts.map((part, index) => ({ index, left: part % HUNDREDTH_SECONDS }));
  byFraction.sort((a, b) => b.left - a.left); // stable: ties keep the order of the parts
  for (const { index } of byFraction.slice(0, total - sum(shares))) shares[index]! += 1;
  return shares;
}

/** A length in hundredths of an hour, half up on exact seconds. */
export function roundedHundredths(seconds: number): number {
  return Math.floor((seconds + HUNDREDTH_SECONDS / 2) / HUNDREDTH_SECONDS);
}

/** Hundredths of an hour as decimal hours: 175 is "1.75". */
export function hoursText(hundredths: number): string {
  return `${Math.floor(hundredths / 100)}.${String(hundredths % 100).padStart(2, "0")}`;
}

/** Hundredths of an hour as a figure to be read, thousands apart: 257350 is "2,573.50". */
export function groupedHours(hundredths: number): string {
  return hoursText(hundredths).replace(/\B(?=(\d{3})+\.)/g, ",");
}

/** One length as decimal hours with two places, half up on exact seconds: 6300 is "1.75". */
export function decimalHour(seconds: number): string {
  return decimalHours([seconds]).total;
}

/**
 * A length as people say it, in whole minutes that have passed: "7 h 05 min", "45 min", "0 min".
 * The unit symbols are the same in every language that we speak.
 *
 * @param seconds 0 or more
 */
export function hoursAndMinutes(seconds: number): string {
  const minutes = Math.floor(seconds / 60);
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60];
  return hours > 0 ? `${hours} h ${String(rest).padStart(2, "0")} min` : `${rest} min`;
}

/** Local time on a 24-hour clock, "09:05"; seconds are cut off, not rounded. */
export function clockText(atMs: number, zone: string): string {
  return clockSecondText(atMs, zone).slice(0, -":00".length);
}

/** Local time to the second on a 24-hour clock, "09:05:09". */
export function clockSecondText(atMs: number, zone: string): string {
  const offset = correctedOffset(atMs, zone);
  if (offset !== null) return clockIn("UTC").format(atMs + writtenOffsetMs(offset));
  return clockIn(zone).format(atMs);
}

/** A kiosk writes its clock every second, and making a formatter costs more than using one. */
const clocks = new Map<string, Intl.DateTimeFormat>();

function clockIn(timeZone: string): Intl.DateTimeFormat {
  const kept = clocks.get(timeZone);
  if (kept) return kept;
  const pair = "2-digit";
  const parts = { hour: pair, minute: pair, second: pair, hourCycle: "h23", timeZone } as const;
  const made = new Intl.DateTimeFormat("en-GB", parts);
  clocks.set(timeZone, made);
  return made;
}

/** An exact length, "7:05:09": hours, minutes and seconds. */
export function secondsText(seconds: number): string {
  const pad = (part: number) => String(part).padStart(2, "0");
  const minutes = Math.floor(seconds / 60);
  return `${Math.floor(minutes / 60)}:${pad(minutes % 60)}:${pad(seconds % 60)}`;
}

/** A date whose year matters, "14 May 2026". */
export function dateText(date: string): string {
  return `${dayText(date, "en-GB").slice(4)} ${date.slice(0, 4)}`;
}

/** A date as the desk writes it, "Thu 14 May", with the language's own words in that order. */
export function dayText(date: string, language: string): string {
  const atMs = Date.parse(date); // a date alone is read as UTC (ECMA-262)
  const parts: Intl.DateTimeFormatOptions[] = [
    { weekday: "short" },
    { day: "numeric" },
    { month: "short" },
  ];
  return parts
    .map((part) => new Intl.DateTimeFormat(language, { ...part, timeZone: "UTC" }).format(atMs))
    .join(" ");
}
