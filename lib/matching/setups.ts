import type { TicketLives } from "@/lib/matching/lives";
import type { BookedPart } from "@/lib/matching/parts";

/** Setup time of a ticket on an operation, in one cell on one production day. */
export interface SetupTime {
  ticket: string;
  operation: string;
  day: string;
  cell: string;
  firstMs: number;
}

/** The setup times of a ticket's operations whose setup is earned when it is booked. */
export function setupTimes(
  ticket: string,
  booked: readonly BookedPart[],
  whenBooked: ReadonlySet<string>,
): SetupTime[] {
  return booked.flatMap(({ operation, day, cell, activity, firstMs }) =>
    activity === "setup" && firstMs !== null && whenBooked.has(operation)
      ? [{ ticket, operation, day, cell, firstMs }]
      : [],
  );
}

/**
 * The setups that a ticket earns by booking them: one a cell and production day with setup time on
 * the operation, whose it is that began first, ties to the lower number.
 *
 * @param rivals of other tickets, in the same cells and on the same days
 */
export function earnedSetups(
  own: readonly SetupTime[],
  rivals: readonly SetupTime[],
  lives: TicketLives,
): BookedPart[] {
  const won = own.filter(
    (one) => !rivals.some((other) => isSamePlace(one, other) && isBefore(other, one)),
  );
  return won.map(({ operation, day, cell }) => {
    const life = lives.operations.find((each) => each.operation === operation);
    const seconds = life?.earning.standard?.setupSeconds ?? 0;
    const nothing = { noStandardSeconds: 0, elsewhereSeconds: 0, pieces: 0, firstMs: null };
    return { operation, day, cell, activity: "earned" as const, seconds, ...nothing };
  });
}

function isSamePlace(one: SetupTime, other: SetupTime): boolean {
  return one.operation === other.operation && one.day === other.day && one.cell === other.cell;
}

function isBefore(one: SetupTime, other: SetupTime): boolean {
  if (one.firstMs !== other.firstMs) return one.firstMs < other.firstMs;
  return one.ticket < other.ticket;
}
