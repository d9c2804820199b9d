import { type BookedTime, stepTimes } from "@/lib/sheet/step-times";
import type { StepTap } from "@/lib/sheet/taps";
import { sum } from "@/lib/sum";
import { split } from "@/lib/timeline/split";

/** A step of an operation as the routing has it. */
export interface Step {
  step: string;
  name: string;
  /** What it takes in whole seconds, against the other steps of the operation. */
  seconds: number;
}

/** A step on the sheet: what it should take, what it took, and how it stands. */
export interface SheetStep {
  step: string;
  name: string;
  /** Its part of the operation's standard; null where the operation has none. */
  standardSeconds: number | null;
  state: "open" | "done" | "skipped";
  actualSeconds: number;
  /** True where its time was shared out among steps tapped off together. */
  together: boolean;
  /** The last tap on it, epoch milliseconds; null before the first. */
  atMs: number | null;
  /** Why it does not apply. */
  reason: string | null;
}

/** The sheet of one ticket operation. */
export interface CellSheet {
  /** In the order of the routing. */
  steps: SheetStep[];
  standardSeconds: number | null;
  /** All time booked to the operation: that of the steps and what is not tapped off yet. */
  actualSeconds: number;
  notTappedSeconds: number;
}

/**
 * Lays out the sheet of an operation. The steps' standards are the operation's own, shared by what
 * each takes, so that they sum to it on every day and with every option. A tap on a step that the
 * routing does not have keeps its time: it is listed last, under its code.
 *
 * @param taps of the operation, in order
 * @param time booked to it by anybody
 */
export function cellSheet(
  steps: readonly Step[],
  standardSeconds: number | null,
  { taps, time }: { taps: readonly StepTap[]; time: readonly BookedTime[] },
): CellSheet {
  const { seconds, together, notTappedSeconds } = stepTimes(taps, time);
  const standards = standardsOf(steps, standardSeconds);
  const known = new Set(steps.map(({ step }) => step));
  const strays = [...new Set(taps.map(({ step }) => step))].filter((step) => !known.has(step));
  const rowOf = (step: string, name: string, standard: number | null): SheetStep => {
    const last = taps.findLast((tap) => tap.step === step);
    return {
      step,
      name,
      standardSeconds: standard,
      state: last ? states[last.kind] : "open",
      actualSeconds: seconds.get(step) ?? 0,
      together: together.has(step),
      atMs: last?.atMs ?? null,
      reason: last?.kind === "skip" ? last.reason : null,
    };
  };
  return {
    steps: [
      ...steps.map(({ step, name }, place) => rowOf(step, name, standards[place] ?? null)),
      ...strays.map((step) => rowOf(step, step, null)),
    ],
    standardSeconds,
    actualSeconds: sum(time.map((one) => one.seconds)),
    notTappedSeconds,
  };
}

const states = { done: "done", open: "open", skip: "skipped" } as const;

function standardsOf(steps: readonly Step[], standardSeconds: number | null): number[] {
  if (standardSeconds === null || steps.length === 0) return [];
  return split(
    standardSeconds,
    steps.map(({ seconds }) => seconds),
  );
}
