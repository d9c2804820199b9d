import { describe, expect, test } from "vitest";
import { randomFrom } from "@/lib/demo/random";
import { takeJob, waitingIn } from "@/lib/simulation/floor";
import { currentStep } from "@/lib/simulation/traveller";
import { calendar, makeTraveller, personOf } from "@/tests/make/hall";

const at = calendar.endsAt;
const random = () => randomFrom("floor");
const numbers = (found: ReturnType<typeof waitingIn>) =>
  found.map(({ traveller }) => traveller.number);

describe("waitingIn", () => {
  test("lists what stands in the cell and has rested, the most urgent first", () => {
    const open = [
      makeTraveller({ number: "1", dueOn: "2026-06-20" }),
      makeTraveller({ number: "2", dueOn: "2026-06-10" }),
      makeTraveller({ number: "3", operation: "130" }),
      { ...makeTraveller({ number: "4" }), readyAt: at + 1 },
    ];
    expect(numbers(waitingIn(open, "Mill", at))).toEqual(["2", "1"]);
    expect(numbers(waitingIn(open, "Mill", at + 1))).toContain("4");
  });

  test("a second person joins a lot with enough left, a third does not", () => {
    const open = [makeTraveller({ lot: 6 })];
    const { crew, toDo } = currentStep(open[0]!)!;
    crew.add("1");
    expect(waitingIn(open, "Mill", at)).toHaveLength(1);
    crew.add("2");
    expect(waitingIn(open, "Mill", at)).toEqual([]);
    crew.delete("2");
    toDo.length = 3;
    expect(waitingIn(open, "Mill", at)).toEqual([]);
  });
});

describe("takeJob", () => {
  const miller = personOf("Mill");

  test("takes the ticket in hand, so that nobody else takes it", () => {
    const open = [makeTraveller({ lot: 1 })];
    expect(takeJob(open, miller, at, random())?.activity).toBe("run");
    expect(takeJob(open, personOf("Mill"), at, random())).toBeNull();
  });

  test("goes on first with what the person left lying the day before", () => {
    const open = ["1", "2", "3", "4", "5"].map((number) => makeTraveller({ number }));
    currentStep(open[4]!)!.lastWorker = miller.number;
    expect(takeJob(open, miller, at, random())?.inHand[0]?.traveller.number).toBe("5");
  });

  test("puts right what was turned back when nothing else of it is left", () => {
    const open = [makeTraveller()];
    const step = currentStep(open[0]!)!;
    step.toDo = [];
    step.toRework = 1;
    expect(takeJob(open, miller, at, random())?.activity).toBe("rework");
  });

  test("racks of the same operation are taken together, up to what a person can mind", () => {
    const sprayed = [2, 3, 2, 4].map((lot, index) =>
      makeTraveller({ number: String(index), lot, operation: "370" }),
    );
    const job = takeJob(sprayed, personOf("Spray"), at, random())!;
    expect(job.inHand.length).toBeGreaterThan(1);
    expect(job.inHand.flatMap(({ step }) => step.toDo).length).toBeLessThanOrEqual(8);
  });

  test("lends a hand to a neighbour only where work has piled up", () => {
    const one = [makeTraveller({ operation: "070" })];
    expect(takeJob(one, miller, at, random())).toBeNull();
    const two = [...one, makeTraveller({ number: "2", operation: "070" })];
    expect(takeJob(two, miller, at, random())?.cell).toBe("CNC");
  });
});
