import { assert } from "@/lib/assert";
import { checkDigit } from "@/lib/codes/damm";

/** Year, five digits of running number, check digit (CALCULATIONS.md 7). */
export const TICKET_DIGITS_MIN = 8;
/** As many as the ledger takes; a running number of twelve digits is never reached. */
export const TICKET_DIGITS_MAX = 15;

const RUNNING_DIGITS_MIN = 5;

/**
 * Makes a ticket number: the two last digits of the year, the running number in at least five
 * digits, the Damm check digit. It is stored and compared in this form, digits only: "26048176".
 *
 * @throws RangeError for a year or a running number that is no whole number of 0 or more, or a
 * running number above twelve digits
 */
export function ticketNumberOf(year: number, running: number): string {
  assert(Number.isInteger(year) && year >= 0, "ticketNumberOf: the year is a whole number");
  assert(Number.isSafeInteger(running) && running >= 0, "ticketNumberOf: a whole running number");
  const yearDigits = String(year % 100).padStart(2, "0");
  const digits = yearDigits + String(running).padStart(RUNNING_DIGITS_MIN, "0");
  assert(digits.length < TICKET_DIGITS_MAX, "ticketNumberOf: the running number is too long");
  return digits + checkDigit(digits);
}

/**
 * A ticket number as people read it, "26-04817-6". What is too short to be one is shown as it is, so
 * that a screen never hides what was keyed.
 */
export function showTicket(number: string): string {
  if (!/^\d+$/.test(number) || number.length < TICKET_DIGITS_MIN) return number;
  return `${number.slice(0, 2)}-${number.slice(2, -1)}-${number.slice(-1)}`;
}

/** What the bar code and the QR code of a ticket carry: `T` and the digits. */
export function ticketCode(number: string): string {
  return `T${number}`;
}
