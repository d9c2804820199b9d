import { cutByDay } from "@/lib/matching/cut";
import type { EndedWork, OperationLife, TicketLives } from "@/lib/matching/lives";
import { type BookedPart, UNKNOWN } from "@/lib/matching/parts";
import { type DayRule, productionDay } from "@/lib/time/site-day";

/** The seconds of each item of the intervals that lie on more than one production day. */
export type SharesOf = (work: EndedWork) => readonly number[] | null;

/** What the booked basis needs beside a ticket's lives. */
export interface BookedFacts {
  rules: readonly DayRule[];
  /** Null for an interval of one item, or where nobody shares it. */
  sharesOf: SharesOf;
}

/**
 * What was booked to a ticket and earned by it, day by day (CALCULATIONS.md 3, the booked basis):
 * time on the production day and in the cell where it was worked, earning on the day and in the cell
 * of the count. Setups that are earned when they are booked are not in it.
 */
export function bookedParts(lives: TicketLives, facts: BookedFacts): BookedPart[] {
  const parts = [
    ...lives.operations.flatMap((life) => [
      ...life.work.flatMap((work) => timeParts(work, isTimed(life), facts)),
      ...earnedParts(life, facts.rules),
    ]),
    ...lives.strays.flatMap((work) => timeParts(work, false, facts)),
  ];
  return mergeParts(parts);
}

/** Says whether an operation's time has a standard to be held against. */
function isTimed({ earning }: OperationLife): boolean {
  return earning.standard !== null;
}

function timeParts(work: EndedWork, hasStandard: boolean, facts: BookedFacts): BookedPart[] {
  const interval = { start: work.startMs / 1000, end: work.endMs / 1000 };
  const shares = facts.sharesOf(work);
  const cut = shares
    ? cutByDay(interval, { shares, item: work.item }, facts.rules)
    : cutByDay(interval, { shares: [interval.end - interval.start], item: 0 }, facts.rules);
  const isWhole = cut.length === 1;
  return cut.map(({ day, seconds: part }) => {
    // an interval that lies on one day is not cut, and its items need not be known
    const seconds = isWhole ? work.seconds : part;
    const isRework = work.activity === "rework";
    return {
      operation: work.operation,
      day,
      cell: work.cell ?? UNKNOWN,
      activity: work.activity,
      seconds,
      // a rework operation earns nothing by rule: that is not the want of a standard
      noStandardSeconds: hasStandard || work.rework ? 0 : seconds,
      elsewhereSeconds: isRework && work.isElsewhere ? seconds : 0,
      pieces: 0,
      firstMs: work.startMs,
    };
  });
}

function earnedParts(life: OperationLife, rules: readonly DayRule[]): BookedPart[] {
  return life.earning.reports.map(({ report, seconds }) => ({
    operation: life.operation,
    day: productionDay(report.atMs, rules),
    cell: report.cell ?? life.cell,
    activity: "earned" as const,
    seconds,
    noStandardSeconds: 0,
    elsewhereSeconds: 0,
    pieces: report.good,
    firstMs: null,
  }));
}

/** Adds up parts of one operation, day, cell and activity; what is nothing is left out. */
export function mergeParts(parts: readonly BookedPart[]): BookedPart[] {
  const merged = new Map<string, BookedPart>();
  for (const part of parts) {
    const key = `${part.operation} ${part.day} ${part.cell} ${part.activity}`;
    const before = merged.get(key);
    merged.set(key, before ? addPart(before, part) : part);
  }
  return [...merged.values()].filter(({ seconds, pieces }) => seconds > 0 || pieces > 0);
}

function addPart(one: BookedPart, other: BookedPart): BookedPart {
  const firsts = [one.firstMs, other.firstMs].filter((ms) => ms !== null);
  return {
    ...one,
    seconds: one.seconds + other.seconds,
    noStandardSeconds: one.noStandardSeconds + other.noStandardSeconds,
    elsewhereSeconds: one.elsewhereSeconds + other.elsewhereSeconds,
    pieces: one.pieces + other.pieces,
    firstMs: firsts.length > 0 ? Math.min(...firsts) : null,
  };
}
