import { z } from "zod";
import { sum } from "@/lib/sum";

/** As many weights as a 1 MB body could hold anyway, with room to spare. */
const WEIGHTS_MAX = 10_000;

const whole = z.number().int().min(0);

/** POST /api/v1/calculate/split: whole seconds, whole weights, exact to the last second. */
export const splitRequest = z
  .strictObject({ seconds: whole, weights: z.array(whole).min(1).max(WEIGHTS_MAX) })
  .refine(({ seconds, weights }) => isExact(seconds, weights), {
    path: ["weights"],
    message: "Too large to share exactly: give smaller weights in the same proportion.",
  });

export const splitAnswer = z.object({ parts: z.array(whole) });

/** Weights that are all nothing count as equal ones. */
function isExact(seconds: number, weights: readonly number[]): boolean {
  return Number.isSafeInteger(seconds * (sum(weights) || weights.length));
}
