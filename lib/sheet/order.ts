import type { CellSheet, SheetStep } from "@/lib/sheet/cell-sheet";

/** The step that is next in the routing's order; null where none is open. */
export function nextStep({ steps }: Pick<CellSheet, "steps">): SheetStep | null {
  return steps.find(({ state }) => state === "open") ?? null;
}

/** The step after the next one, for "then: …"; null where the next one is the last. */
export function stepAfter({ steps }: Pick<CellSheet, "steps">): SheetStep | null {
  return steps.filter(({ state }) => state === "open")[1] ?? null;
}

/** Says whether a step is open, and not the next: to tap it off takes one more tap. */
export function isOutOfOrder(sheet: Pick<CellSheet, "steps">, step: string): boolean {
  const isOpen = sheet.steps.some((one) => one.step === step && one.state === "open");
  return isOpen && nextStep(sheet)?.step !== step;
}

/** How many steps are tapped off, of those that apply. */
export function tappedOff({ steps }: { steps: readonly Pick<SheetStep, "state">[] }): {
  done: number;
  of: number;
} {
  const applies = steps.filter(({ state }) => state !== "skipped");
  return { done: applies.filter(({ state }) => state === "done").length, of: applies.length };
}
