import type { LooseEndCode } from "@/lib/ledger/schema";

/** What is open about someone's time, as the office says it. */
const words: Record<LooseEndCode, string> = {
  unreadable: "a record could not be read",
  "id-clash": "two records have one number",
  "unknown-worker": "a record of an unknown number",
  unproved: "a PIN could not be checked",
  revoked: "a record of a tablet out of use",
  future: "a record from the future",
  "no-shift-end": "no shift end tapped",
  "implied-start": "no shift start tapped",
  "already-in": "started twice",
  "two-kiosks": "two tablets disagree",
  "break-long": "a long break",
  "break-open": "a break without an end",
  "shift-long": "a long shift",
  "rest-short": "little time between shifts",
  "session-late": "a record after the shift",
  "since-outside": "a start that could not be taken",
  "undo-late": "taken back too late",
  "clock-unmeasured": "the tablet's clock was not known",
  "unknown-ticket": "a ticket nobody knows",
  "out-of-order": "started before its turn",
  "on-hold": "worked on while held",
  "no-qualification": "a qualification is missing",
  "over-count": "more counted than there is",
  "count-without-work": "counted, nobody worked on it",
  "past-finish": "worked on after it was finished",
  "wrong-cell": "worked on in another cell",
  "ticket-scrapped": "worked on after it was scrapped",
  objection: "called a count wrong",
  "deduction-unattested": "a meal was not confirmed",
};

/** Says an open question in words; a code of a later version is shown as it is. */
export function looseEndWords(code: string): string {
  return (words as Record<string, string>)[code] ?? code;
}
