import type { EndedWork, OperationLife, TicketLives } from "@/lib/matching/lives";
import { type BookedPart, type MatchedPart, UNKNOWN } from "@/lib/matching/parts";
import { sum } from "@/lib/sum";
import { type DayRule, productionDay } from "@/lib/time/site-day";
import { split } from "@/lib/timeline/split";

/** What is to be shared among the cells of one finished operation. */
interface Finish {
  operation: string;
  rework: string;
  day: string;
  /** Where its earning is where nobody booked time that earns. */
  cell: string;
  /** Pieces, and the operation's own cell: they count there, whoever counted them. */
  pieces: number;
  ownCell: string;
  hasStandard: boolean;
  work: readonly EndedWork[];
  /** Earned by cell of the count, or of the setup that was earned when booked. */
  earned: readonly { cell: string; seconds: number }[];
}

/**
 * What a ticket's finished operations took and earned, on the production day on which each was
 * finished (CALCULATIONS.md 3, the matched basis): all the time ever booked to them, and their
 * earning shared among the cells by setup, run and inspect seconds.
 *
 * @param setups earned when they were booked
 */
export function matchedParts(
  lives: TicketLives,
  { rules, setups }: { rules: readonly DayRule[]; setups: readonly BookedPart[] },
): MatchedPart[] {
  const finishes = lives.operations.flatMap((life) => finishOf(life, { rules, setups }));
  return [...finishes, ...reworkFinishes(lives, rules)].flatMap(shared);
}

function finishOf(
  life: OperationLife,
  { rules, setups }: { rules: readonly DayRule[]; setups: readonly BookedPart[] },
): Finish[] {
  const { operation, cell, finishedMs, good, earning } = life;
  if (finishedMs === null) return [];
  const counted = earning.reports.map(({ report, seconds }) => {
    return { cell: report.cell ?? cell, seconds };
  });
  const own = setups.filter((setup) => setup.operation === operation);
  const last = earning.reports.findLast(({ report }) => report.atMs <= finishedMs);
  return [
    {
      operation,
      rework: "",
      day: productionDay(finishedMs, rules),
      cell: last?.report.cell ?? cell,
      pieces: good,
      ownCell: cell,
      hasStandard: earning.standard !== null,
      work: life.work.filter(({ rework }) => rework === null),
      earned: [...counted, ...own],
    },
  ];
}

function reworkFinishes({ operations, reworks }: TicketLives, rules: readonly DayRule[]): Finish[] {
  return reworks.flatMap(({ event, operation, closedMs }) => {
    const life = operations.find((one) => one.operation === operation);
    if (!life || closedMs === null) return [];
    const work = life.work.filter(({ rework }) => rework?.event === event);
    const day = productionDay(closedMs, rules);
    const nothing = { pieces: 0, hasStandard: true, earned: [] };
    const { cell } = life;
    return [{ operation, rework: event, day, cell, ownCell: cell, work, ...nothing }];
  });
}

/** Shares a finish among the cells that had a part in it; cells without any are left out. */
function shared(finish: Finish): MatchedPart[] {
  const { operation, rework, day, work, earned, pieces, ownCell } = finish;
  const named = [...work.map(cellOf), ...earned.map(({ cell }) => cell), finish.cell, ownCell];
  const cells = [...new Set(named)];
  const weights = cells.map((cell) => secondsOf(work.filter((one) => isEarning(one, cell))));
  const total = sum(earned.map(({ seconds }) => seconds));
  const isWorked = sum(weights) > 0;
  const shares = isWorked
    ? split(total, weights)
    : cells.map((cell) => (cell === finish.cell ? total : 0));
  return cells
    .map((cell, place) => {
      const own = work.filter((one) => cellOf(one) === cell);
      const redone = own.filter((one) => rework !== "" || one.activity === "rework");
      return {
        operation,
        rework,
        day,
        cell,
        pieces: cell === ownCell ? pieces : 0,
        actualSeconds: secondsOf(own),
        reworkSeconds: secondsOf(redone),
        elsewhereSeconds: secondsOf(redone.filter(({ isElsewhere }) => isElsewhere)),
        noStandardSeconds: finish.hasStandard ? 0 : secondsOf(own),
        noStandardReworkSeconds: finish.hasStandard ? 0 : secondsOf(redone),
        earnedSeconds: shares[place]!,
        reportEarnedSeconds: sum(
          earned.filter((one) => one.cell === cell).map(({ seconds }) => seconds),
        ),
      };
    })
    .filter(
      (part) =>
        part.actualSeconds + part.pieces + part.earnedSeconds + part.reportEarnedSeconds > 0,
    );
}

function isEarning(one: EndedWork, cell: string): boolean {
  return cellOf(one) === cell && one.activity !== "rework";
}

function cellOf({ cell }: EndedWork): string {
  return cell ?? UNKNOWN;
}

function secondsOf(work: readonly EndedWork[]): number {
  return sum(work.map(({ seconds }) => seconds));
}
