import { bookedParts, mergeParts, type SharesOf } from "@/lib/matching/booked";
import { livesOf, type MatchingFacts, type TicketLives } from "@/lib/matching/lives";
import { matchedParts } from "@/lib/matching/matched";
import type { OverPart, TicketParts } from "@/lib/matching/parts";
import { earnedSetups, type SetupTime, setupTimes } from "@/lib/matching/setups";
import { sum } from "@/lib/sum";
import type { TicketBook } from "@/lib/tickets/book";

/** What a ticket's parts need beside its book. */
export interface PartsFacts extends MatchingFacts {
  sharesOf: SharesOf;
  /** Setup times of other tickets on operations whose setup is earned when it is booked. */
  rivals: readonly SetupTime[];
}

/** A ticket's parts, and the setup times by which it and others earn setups. */
export interface PartedTicket extends TicketParts {
  setups: SetupTime[];
}

/**
 * All that a ticket gives to the comparison of standard and actual: what was booked to it, what it
 * took when it was finished, and where it is over its standard before it is. What runs is left out
 * until it ends, as what is kept must not depend on when it was made.
 */
export function ticketParts(book: TicketBook, facts: PartsFacts): PartedTicket {
  const lives = livesOf(book, facts);
  const { rules, whenBooked } = facts;
  const booked = bookedParts(lives, facts);
  const setups = setupTimes(book.ticket, booked, whenBooked);
  const won = earnedSetups(setups, facts.rivals, lives);
  return {
    booked: mergeParts([...booked, ...won]),
    matched: matchedParts(lives, { rules, setups: won }),
    over: overParts(lives),
    setups,
  };
}

function overParts({ operations }: TicketLives): OverPart[] {
  return operations.flatMap(({ operation, cell, isOpen, quantity, earning, work }) => {
    if (!isOpen || !earning.standard) return [];
    const { setupSeconds, runSeconds } = earning.standard;
    const standardSeconds = setupSeconds + runSeconds * quantity;
    const actualSeconds = sum(work.map(({ seconds }) => seconds));
    return actualSeconds > standardSeconds
      ? [{ operation, cell, standardSeconds, actualSeconds }]
      : [];
  });
}
