import type { DemoModel } from "@/lib/demo/models";

/** A step that a technician taps off, with the minutes that it takes on an ordinary instrument. */
export interface DemoStep {
  step: string;
  name: string;
  minutes: number;
}

type Row = readonly [name: string, minutes: number];

/** The operation that is built in steps. */
const WHOLE_INSTRUMENT = "495";

const solid: readonly Row[] = [
  ["Dry-fit neck, check angle", 4],
  ["Bolt neck", 3],
  ["Bushings and tuners", 7],
  ["Bridge, ground wire", 6],
  ["Pickups, control plate", 7],
  ["Solder and test circuit", 8],
  ["Strap buttons, cover plates", 3],
  ["Wipe down, look over", 4],
];

const archtop: readonly Row[] = [
  ["Clean neck joint, check angle", 4],
  ["Bushings and tuners", 7],
  ["Tailpiece, strap button", 4],
  ["Fit bridge to the top", 9],
  ["Pickups, harness", 6],
  ["Solder and test circuit", 6],
  ["Finger rest, knobs", 3],
  ["Wipe down, look over", 3],
];

/** The steps of a model's operation in order; none for one that is not built in steps. */
export function stepsOf(model: DemoModel, operation: string): DemoStep[] {
  if (operation !== WHOLE_INSTRUMENT || !model.whole) return [];
  const rows = model.build === "archtop" ? archtop : solid;
  return rows.map(([name, minutes], place) => ({ step: String(place + 1), name, minutes }));
}
