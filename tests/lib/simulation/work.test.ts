import { describe, expect, test } from "vitest";
import { cautionVersion } from "@/lib/bench/cautions";
import { randomFrom } from "@/lib/demo/random";
import { takeJob } from "@/lib/simulation/floor";
import { currentStep, openPieces, type Traveller } from "@/lib/simulation/traveller";
import { doJob, itemOf } from "@/lib/simulation/work";
import { sum } from "@/lib/sum";
import {
  eventsOf,
  kindsOf,
  makeBench,
  makeHall,
  makeTraveller,
  personOf,
  through,
} from "@/tests/make/hall";

/** A hall whose luck is good: every piece comes out right. */
function luckyHall(open: Traveller[], seed?: string) {
  const hall = makeHall(open, seed);
  return { ...hall, tempo: { ...hall.tempo, outcome: () => "good" as const } };
}

function work(
  open: Traveller[],
  cell: Parameters<typeof personOf>[0],
  hall = luckyHall(open),
  later = 0,
) {
  const bench = makeBench(hall, personOf(cell));
  bench.at += later;
  through(doJob(bench, takeJob(open, bench.person, bench.at, randomFrom("job"))!));
  return { hall, bench };
}

describe("doJob", () => {
  test("begins with a tap and ends with the count, and the ticket goes on", () => {
    const ticket = makeTraveller({ lot: 3 });
    const { hall, bench } = work([ticket], "Mill");
    const [first, last] = [eventsOf(hall)[0], eventsOf(hall).at(-1)];
    const item = { ticket: ticket.number, operation: "010" };
    expect(first).toMatchObject({ kind: "work", activity: "run", items: [item] });
    expect(last).toMatchObject({ kind: "report", ...item, good: 3, stop: true });
    expect(currentStep(ticket)?.operation.code).toBe("020");
    expect(ticket.steps[0]!.crew.has(bench.person.number)).toBe(false);
  });

  test("makes ready before the first piece, where the operation asks for it", () => {
    const ticket = makeTraveller({ lot: 1, operation: "060" });
    const { hall } = work([ticket], "Mill");
    const [setup, run] = eventsOf(hall).filter((event) => event.kind === "work");
    expect(setup).toMatchObject({ activity: "setup" });
    expect(run).toMatchObject({ activity: "run" });
  });

  test("a caution is answered before the first tap, once in a shift", () => {
    const open = ["1", "2"].map((number) => makeTraveller({ number, lot: 1, operation: "300" }));
    const hall = luckyHall(open);
    const bench = makeBench(hall, personOf("Neck"));
    for (const _ of open) {
      through(doJob(bench, takeJob(open, bench.person, bench.at, randomFrom("job"))!));
    }
    const kinds = kindsOf(hall).filter((kind) => kind === "caution-read" || kind === "work");
    expect(kinds).toEqual(["caution-read", "work", "work"]);
    expect(eventsOf(hall)[0]).toMatchObject({
      operation: "300",
      version: cautionVersion(["dust"]),
    });
  });

  test("the end of the shift counts what is done and leaves the rest for tomorrow", () => {
    const ticket = makeTraveller({ lot: 12 });
    const hall = luckyHall([ticket]);
    const bench = makeBench(hall, personOf("Mill"));
    bench.stopAt = bench.at + 3_000;
    through(doJob(bench, takeJob([ticket], bench.person, bench.at, randomFrom("job"))!));
    const step = currentStep(ticket)!;
    const good = eventsOf(hall).map((event) => (event.kind === "report" ? event.good : 0));
    expect(sum(good)).toBe(12 - openPieces(step));
    expect(sum(good)).toBeGreaterThan(2);
    expect(step).toMatchObject({ lastWorker: bench.person.number, inHand: 0 });
    expect(step.toDo[0]).toBeLessThan(1);
  });

  test("a piece that fails an inspection is turned back with its cause, put right and passed", () => {
    const ticket = makeTraveller({ lot: 2, operation: "420" });
    const hall = luckyHall([ticket]);
    let fails = 1;
    const troubles = { ...hall.troubles, mustFail: () => fails-- > 0 };
    const { hall: played } = work([ticket], "Inspection", { ...hall, troubles });
    const failed = eventsOf(played).at(-1);
    expect(failed).toMatchObject({ kind: "inspect", good: 1, rework: 1 });
    expect(failed).toHaveProperty("causedBy");
    expect(failed).toHaveProperty("defects");
    work([ticket], "Inspection", { ...hall, troubles }, 3_600);
    expect(eventsOf(played).at(-3)).toMatchObject({ kind: "work", activity: "rework" });
    expect(eventsOf(played).at(-1)).toMatchObject({ kind: "inspect", good: 1, rework: 0 });
    expect(currentStep(ticket)?.operation.code).not.toBe("420");
  });

  test("tickets taken together share one tap and are each counted", () => {
    const open = ["1", "2"].map((number) => makeTraveller({ number, lot: 2, operation: "360" }));
    const { hall } = work(open, "Spray");
    const tap = eventsOf(hall).find(({ kind }) => kind === "work");
    expect(tap).toMatchObject({ kind: "work", items: [{ ticket: "1" }, { ticket: "2" }] });
    expect(kindsOf(hall).filter((kind) => kind === "report")).toHaveLength(2);
  });

  test("a slip of the finger is undone within ten seconds", () => {
    const undone = Array.from({ length: 300 }, (_, seed) => {
      const open = [makeTraveller({ number: "1", lot: 1 }), makeTraveller({ number: "2", lot: 1 })];
      return eventsOf(work(open, "Mill", luckyHall(open, String(seed))).hall);
    }).find((events) => events.some(({ kind }) => kind === "undo"))!;
    const at = undone.findIndex(({ kind }) => kind === "undo");
    const [wrong, undo] = [undone[at - 1]!, undone[at]!];
    expect(undo).toMatchObject({ event: wrong.id });
    expect(Date.parse(undo.at) - Date.parse(wrong.at)).toBeLessThan(10_000);
  });
});

describe("itemOf", () => {
  test("names the ticket and the operation", () => {
    const traveller = makeTraveller({ number: "26038719" });
    const step = traveller.steps[0]!;
    expect(itemOf({ traveller, step })).toEqual({ ticket: "26038719", operation: "010" });
  });
});
