import { type DemoModel, NEW_MODEL } from "@/lib/demo/models";
import type { DemoOperation } from "@/lib/demo/operations";
import { type Random, randomFrom } from "@/lib/demo/random";

/** The operation that creeps over its standard in the course of the history. */
export const DRIFTING = "160";
/** It begins to drift on this day and is this much slower on the last. */
const DRIFT = { fromDay: 14, days: 42, atEnd: 0.34 };

/**
 * The new model's first piece takes this many times the later ones, and each doubling of the pieces
 * built takes the slope's share of the time before (Crawford's unit model).
 */
const LEARNING = { firstUnit: 2.1, slope: 0.88 };

/** How much slower the richer finish is, as the standards' adders say. */
const RICH_FINISH: Record<string, number> = { "390": 4, "410": 3 };

/** What happens to a piece, by stage: chances of rework and of scrap at one operation. */
const LUCK: Record<string, { rework: number; scrap: number }> = {
  Timber: { rework: 0.004, scrap: 0.002 },
  Machining: { rework: 0.003, scrap: 0.002 },
  Body: { rework: 0.006, scrap: 0.0006 },
  Binding: { rework: 0.012, scrap: 0.0003 },
  Neck: { rework: 0.008, scrap: 0.0006 },
  Finish: { rework: 0.018, scrap: 0.0001 },
  Electrics: { rework: 0.015, scrap: 0.001 },
  Assembly: { rework: 0.008, scrap: 0 },
  "Set-up": { rework: 0.012, scrap: 0 },
};

/** One piece of work that someone is about to do. */
export interface Stint {
  model: DemoModel;
  option: string;
  operation: DemoOperation;
  worker: string;
  /** Day of the history, for what changes with time. */
  day: number;
}

/** How fast work goes at Larkmoor Stringworks, and how well. */
export interface Tempo {
  setupSeconds(stint: Stint): number;
  pieceSeconds(stint: Stint): number;
  reworkSeconds(stint: Stint): number;
  outcome(stint: Stint): "good" | "rework" | "scrap";
}

/** Opens the tempo of one run; it counts the new model's pieces as they are built. */
export function tempoOf(random: Random): Tempo {
  const built = new Map<string, number>();
  const learning = ({ model, operation }: Stint) => {
    if (model.name !== NEW_MODEL) return 1;
    const unit = (built.get(operation.code) ?? 0) + 1;
    built.set(operation.code, unit);
    return Math.max(0.95, LEARNING.firstUnit * unit ** Math.log2(LEARNING.slope));
  };
  const pace = (stint: Stint) =>
    paceOf(stint.worker) * biasOf(stint) * driftOf(stint) * random.spread(0.14);
  const runSeconds = (stint: Stint) =>
    60 *
    (stint.operation.runMinutes * stint.model.effort +
      (isRich(stint) ? (RICH_FINISH[stint.operation.code] ?? 0) : 0));
  return {
    setupSeconds: (stint) => stint.operation.setupMinutes * 60 * random.spread(0.25),
    pieceSeconds: (stint) => runSeconds(stint) * pace(stint) * learning(stint),
    reworkSeconds: (stint) => runSeconds(stint) * random.between(0.4, 1.1),
    outcome: ({ operation }) => {
      const { rework, scrap } = LUCK[operation.stage] ?? { rework: 0, scrap: 0 };
      const share = operation.activity === "inspect" ? rework * 3 : rework;
      const throwOfTheDie = random.next();
      if (throwOfTheDie < scrap) return "scrap";
      return throwOfTheDie < scrap + share ? "rework" : "good";
    },
  };
}

function isRich({ model, option }: Stint): boolean {
  return option === model.options[1];
}

/** Hands differ; nobody sees this figure, and no screen makes one of it. */
function paceOf(worker: string): number {
  return factorOf(`pace ${worker}`);
}

/** How far a model's standard is from the truth. */
function biasOf({ model, operation }: Stint): number {
  return 1.06 * factorOf(`bias ${model.name} ${operation.code}`);
}

const factors = new Map<string, number>();

/** A lasting factor around 1 that belongs to a name. */
function factorOf(name: string): number {
  const factor = factors.get(name) ?? randomFrom(name).between(0.88, 1.1);
  factors.set(name, factor);
  return factor;
}

function driftOf({ operation, day }: Stint): number {
  if (operation.code !== DRIFTING) return 1;
  const share = Math.min(1, Math.max(0, (day - DRIFT.fromDay) / DRIFT.days));
  return 1 + DRIFT.atEnd * share;
}
