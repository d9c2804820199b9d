import { isChecked } from "@/lib/codes/damm";

/** A number that a wrong one may have meant, and the first position where the two part. */
export interface NearMiss {
  number: string;
  /** Index, from 0, of the doubtful digit in what was read. */
  at: number;
}

/**
 * Lists the numbers with a right check digit that differ from `digits` by one digit or by one swap
 * of neighbours, from the left; at each position one digit would do. Empty for a right number: then
 * no single slip explains it.
 */
export function nearMisses(digits: string): NearMiss[] {
  if (isChecked(digits)) return [];
  return [...digits].flatMap((_, at) =>
    [...otherDigits(digits, at), swapped(digits, at)]
      .filter(isChecked)
      .map((number) => ({ number, at })),
  );
}

/**
 * Finds the number among `known` (the tickets of a cell, likeliest first) that `digits` most
 * likely meant: one digit wrong, two neighbours swapped, one digit lost or one too many. A wrong
 * digit or a swap comes before a lost or extra one; null where nothing known is that near.
 */
export function nearestKnown(digits: string, known: readonly string[]): NearMiss | null {
  const near =
    known.find((number) => isOneSlip(digits, number)) ??
    known.find((number) => isOneLost(digits, number) || isOneLost(number, digits));
  return near === undefined ? null : { number: near, at: firstDifference(digits, near) };
}

function otherDigits(digits: string, at: number): string[] {
  return [..."0123456789"]
    .filter((digit) => digit !== digits[at])
    .map((digit) => digits.slice(0, at) + digit + digits.slice(at + 1));
}

/** The digits with those at `at` and `at + 1` swapped; at the end, or where equal, as they are. */
function swapped(digits: string, at: number): string {
  const [first = "", second = ""] = digits.slice(at, at + 2);
  return digits.slice(0, at) + second + first + digits.slice(at + 2);
}

function isOneSlip(read: string, meant: string): boolean {
  if (read.length !== meant.length || read === meant) return false;
  const at = firstDifference(read, meant);
  return read.slice(at + 1) === meant.slice(at + 1) || swapped(read, at) === meant;
}

function isOneLost(shorter: string, longer: string): boolean {
  const at = firstDifference(shorter, longer);
  return longer.length === shorter.length + 1 && shorter.slice(at) === longer.slice(at + 1);
}

function firstDifference(a: string, b: string): number {
  const at = [...a].findIndex((digit, position) => digit !== b[position]);
  return at < 0 ? a.length : at;
}
