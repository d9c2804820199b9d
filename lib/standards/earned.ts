import type { Standard } from "@/lib/standards/in-force";

/** What a report of one ticket operation counted, as far as earning goes. */
export interface EarningReport {
  event: string;
  /** An inspection earns per piece at the first pass or fail; anything else per good piece. */
  kind: "report" | "inspect";
  good: number;
  rework: number;
  scrap: number;
}

/** What one report earned, in whole seconds. */
interface Earning {
  event: string;
  setupSeconds: number;
  runSeconds: number;
}

/** All that a ticket operation earned; without a standard it earns nothing, and `hasStandard` says so. */
export interface Earned {
  hasStandard: boolean;
  seconds: number;
  byReport: Earning[];
}

/**
 * The seconds that the reports of one ticket operation earn (CALCULATIONS.md 3): run standard ×
 * pieces, plus the setup standard once, with the first piece that earns. Rework and scrap earn
 * nothing. A piece earns an operation once: counts beyond `quantity` earn nothing, and a piece that
 * an inspector sees again does not earn again.
 *
 * @param reports in the ledger's order
 * @param facts `standard` is the one in force for the whole operation, null where none is set
 */
export function earnedSeconds(
  reports: readonly EarningReport[],
  { standard, quantity }: { standard: Standard | null; quantity: number },
): Earned {
  const { setupSeconds, runSeconds } = standard ?? { setupSeconds: 0, runSeconds: 0 };
  const byReport: Earning[] = [];
  let earnedPieces = 0;
  for (const report of reports) {
    const pieces = Math.min(piecesOf(report), quantity - earnedPieces);
    byReport.push({
      event: report.event,
      setupSeconds: earnedPieces === 0 && pieces > 0 ? setupSeconds : 0,
      runSeconds: runSeconds * pieces,
    });
    earnedPieces += pieces;
  }
  const seconds = byReport.reduce((total, one) => total + one.setupSeconds + one.runSeconds, 0);
  return { hasStandard: standard !== null, seconds, byReport };
}

function piecesOf({ kind, good, rework, scrap }: EarningReport): number {
  return kind === "inspect" ? good + rework + scrap : good;
}
