import { describe, expect, test } from "vitest";
import { models } from "@/lib/demo/models";
import { routingOf } from "@/lib/demo/operations";
import {
  countPieces,
  currentStep,
  freshStep,
  openPieces,
  type Traveller,
} from "@/lib/simulation/traveller";

const routing = routingOf(models[0]!).slice(0, 2);

function ticket(lot: number): Traveller {
  return {
    number: "26038719",
    model: models[0]!,
    option: "Natural satin",
    order: "24110",
    dueOn: "2026-06-01",
    releasedAt: 0,
    lot,
    quantity: lot,
    steps: routing.map((operation) => freshStep(operation, lot)),
    current: 0,
    readyAt: 0,
    endedAt: null,
  };
}

/** Takes pieces in hand and counts them at second 100. */
function count(traveller: Traveller, counts: { good?: number; rework?: number; scrap?: number }) {
  const step = currentStep(traveller)!;
  const { good = 0, rework = 0, scrap = 0 } = counts;
  for (let piece = 0; piece < good + rework + scrap; piece += 1) {
    step.toDo.shift();
    step.inHand += 1;
  }
  countPieces(traveller, step, { good, rework, scrap, at: 100, restsSeconds: 50 });
}

describe("countPieces", () => {
  test("the count that leaves nothing open finishes the step, and the work then rests", () => {
    const traveller = ticket(3);
    count(traveller, { good: 2 });
    expect(traveller.current).toBe(0);
    expect(openPieces(currentStep(traveller)!)).toBe(1);
    count(traveller, { good: 1 });
    expect(traveller).toMatchObject({ current: 1, readyAt: 150, endedAt: null });
    expect(traveller.steps[0]?.finishedAt).toBe(100);
  });

  test("scrap is gone from the operations that follow, rework is not", () => {
    const traveller = ticket(3);
    count(traveller, { good: 1, scrap: 1, rework: 1 });
    expect(traveller).toMatchObject({ current: 0, quantity: 2 });
    expect(currentStep(traveller)?.toRework).toBe(1);
    currentStep(traveller)!.toRework = 0;
    currentStep(traveller)!.inHand = 1;
    countPieces(traveller, currentStep(traveller)!, {
      good: 1,
      rework: 0,
      scrap: 0,
      at: 200,
      restsSeconds: 0,
    });
    expect(currentStep(traveller)?.toDo).toHaveLength(2);
  });

  test("a ticket ends with its last operation, or with its last piece", () => {
    const built = ticket(1);
    count(built, { good: 1 });
    count(built, { good: 1 });
    expect(built.endedAt).toBe(100);
    expect(currentStep(built)).toBeNull();
    const scrapped = ticket(1);
    count(scrapped, { scrap: 1 });
    expect(scrapped).toMatchObject({ endedAt: 100, quantity: 0 });
  });
});

describe("freshStep", () => {
  test("needs setting up only where the operation has make-ready", () => {
    const saw = routingOf(models[0]!).find(({ code }) => code === "060")!;
    expect(freshStep(saw, 1).isSetUp).toBe(false);
    expect(freshStep(routing[0]!, 1).isSetUp).toBe(true);
  });
});
