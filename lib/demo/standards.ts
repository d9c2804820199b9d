import type { DemoModel } from "@/lib/demo/models";
import { models, NEW_MODEL } from "@/lib/demo/models";
import { type DemoOperation, routingOf } from "@/lib/demo/operations";

/** A standard time as it was entered: the base of a model's operation, or an option's adder. */
export interface DemoStandard {
  model: string;
  operation: string;
  /** The option whose adder it is; null for the base. */
  option: string | null;
  setupSeconds: number;
  runSeconds: number;
  /** Days after the history's first day on which it takes effect; negative: before it. */
  fromDay: number;
  reason: string;
}

/** Long before the history begins. */
const LONG_BEFORE = -200;
/** The day on which the new model came to the floor with what the first ones were thought to take. */
export const NEW_MODEL_DAY = -10;

/** An operation nobody has timed yet: its work earns nothing, and the screens say so. */
export const UNTIMED = { model: "Dipper", operation: "410" } as const;

/** What the richer finish of each model adds, in minutes a piece. */
const adderMinutes: Record<string, number> = { "390": 4, "410": 3 };

/** Standards that changed while the history ran: new tools, a study, a better jig. */
const changes: readonly (Pick<DemoStandard, "model" | "operation" | "fromDay" | "reason"> & {
  factor: number;
})[] = [
  { model: "Heron", operation: "280", factor: 0.86, fromDay: 25, reason: "New fret press" },
  { model: "Wren", operation: "280", factor: 0.86, fromDay: 25, reason: "New fret press" },
  {
    model: "Kestrel",
    operation: "190",
    factor: 1.08,
    fromDay: 35,
    reason: "Time study of 24 pieces",
  },
  {
    model: "Avocet",
    operation: "220",
    factor: 1.1,
    fromDay: 35,
    reason: "Binding of five plies",
  },
  {
    model: NEW_MODEL,
    operation: "300",
    factor: 1.15,
    fromDay: 32,
    reason: "Time study of 14 pieces",
  },
];

/** All standards of the seven models: bases, adders and the changes within the history. */
export const standards: readonly DemoStandard[] = models.flatMap((model) => [
  ...routingOf(model).filter(isTimed(model)).map(baseOf(model)),
  ...routingOf(model).filter(isTimed(model)).flatMap(adderOf(model)),
  ...changes.filter((change) => change.model === model.name).map(changeOf(model)),
]);

function isTimed(model: DemoModel): (operation: DemoOperation) => boolean {
  return ({ code }) => !(model.name === UNTIMED.model && code === UNTIMED.operation);
}

function baseOf(model: DemoModel): (operation: DemoOperation) => DemoStandard {
  const fromDay = model.name === NEW_MODEL ? NEW_MODEL_DAY : LONG_BEFORE;
  const reason = model.name === NEW_MODEL ? "Estimate for the first lots" : "Time study";
  return (operation) => ({ ...secondsOf(model, operation, 1), option: null, fromDay, reason });
}

function adderOf(model: DemoModel): (operation: DemoOperation) => DemoStandard[] {
  return ({ code }) => {
    const minutes = adderMinutes[code];
    const option = model.options[1];
    if (!minutes || !option) return [];
    const adder = { setupSeconds: 0, runSeconds: minutes * 60, fromDay: LONG_BEFORE };
    return [{ model: model.name, operation: code, option, ...adder, reason: "More coats" }];
  };
}

function changeOf(model: DemoModel): (change: (typeof changes)[number]) => DemoStandard {
  return ({ operation: code, factor, fromDay, reason }) => {
    const operation = routingOf(model).find((each) => each.code === code);
    if (!operation) throw new RangeError(`standards: ${model.name} has no operation ${code}`);
    return { ...secondsOf(model, operation, factor), option: null, fromDay, reason };
  };
}

function secondsOf(model: DemoModel, operation: DemoOperation, factor: number) {
  return {
    model: model.name,
    operation: operation.code,
    setupSeconds: operation.setupMinutes * 60,
    runSeconds: Math.round(operation.runMinutes * model.effort * factor * 2) * 30,
  };
}
