import { readCode } from "@/lib/codes/read-code";
import { no, ok, type Result } from "@/lib/result";

/**
 * The ticket number that a scanned or keyed text means, digits only, as tickets are stored. A text
 * that cannot be a ticket is refused as `invalid` at `code`, saying which it is: the form, the
 * check digit, or the code of something else.
 */
export function decideTicketNumber(text: string): Result<string> {
  const { valid, kind, number, problem } = readCode(text);
  if (problem === "check") {
    return refused("A digit is wrong: the check digit does not fit. Read the number again.");
  }
  if (!valid || number === null) {
    return refused("That is no ticket number. One has eight digits or more, such as 26-04817-6.");
  }
  return kind === "ticket" ? ok(number) : refused(`That is a ${kind}, no ticket.`);
}

function refused(message: string) {
  return no("invalid", message, { errors: [{ path: "code", message }] });
}
