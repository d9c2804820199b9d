import { isChecked } from "@/lib/codes/damm";
import type { CodeKind, CodeReading } from "@/lib/codes/schema";
import { TICKET_DIGITS_MAX, TICKET_DIGITS_MIN } from "@/lib/codes/ticket-code";

/** White space, a scanner's line end, and every hyphen or dash that a keyboard may offer. */
const FORGIVEN = /[\s\u00ad\u2010-\u2015\u2212-]/g;

/** A badge's or carrier's number has one to eight digits (as the ledger takes), then the check. */
const SHORT_DIGITS = { min: 2, max: 9 };

const forms: Record<string, { kind: CodeKind; min: number; max: number }> = {
  "": { kind: "ticket", min: TICKET_DIGITS_MIN, max: TICKET_DIGITS_MAX },
  T: { kind: "ticket", min: TICKET_DIGITS_MIN, max: TICKET_DIGITS_MAX },
  W: { kind: "badge", ...SHORT_DIGITS },
  C: { kind: "carrier", ...SHORT_DIGITS },
};

/**
 * Reads any scanned or keyed text as a ticket (`T26048176`, `26-04817-6`, `26048176`), a badge (`W`)
 * or a carrier (`C`). Spaces, hyphens and lower case are forgiven; bare digits are a ticket.
 * `problem` says which it is: `form` is no code of ours, `check` has a wrong digit somewhere. Whether
 * the number is known at the site is for the caller to ask.
 */
export function readCode(text: string): CodeReading {
  const match = /^([TWC]?)(\d+)$/.exec(text.replace(FORGIVEN, "").toUpperCase());
  const [, prefix = "", digits = ""] = match ?? [];
  const form = forms[prefix];
  if (!form || digits.length < form.min || digits.length > form.max) {
    return { valid: false, kind: null, number: null, problem: "form" };
  }
  const number = form.kind === "ticket" ? digits : digits.slice(0, -1);
  if (isChecked(digits)) return { valid: true, kind: form.kind, number };
  return { valid: false, kind: form.kind, number, problem: "check" };
}
