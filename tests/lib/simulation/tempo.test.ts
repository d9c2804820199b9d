import { describe, expect, test } from "vitest";
import { models, NEW_MODEL } from "@/lib/demo/models";
import { operations } from "@/lib/demo/operations";
import { randomFrom } from "@/lib/demo/random";
import { DRIFTING, type Stint, tempoOf } from "@/lib/simulation/tempo";
import { sum } from "@/lib/sum";

const stint = (name: string, code: string, more: Partial<Stint> = {}): Stint => {
  const model = models.find((each) => each.name === name)!;
  const operation = operations.find((each) => each.code === code)!;
  return { model, option: model.options[0]!, operation, worker: "1001", day: 0, ...more };
};

const mean = (of: Stint, pieces = 400) => {
  const tempo = tempoOf(randomFrom("mean"));
  return sum(Array.from({ length: pieces }, () => tempo.pieceSeconds(of))) / pieces;
};

describe("tempoOf", () => {
  test("a piece takes about its standard time, never a wild one", () => {
    const tempo = tempoOf(randomFrom("tempo"));
    const standard = 18 * 60;
    for (let piece = 0; piece < 500; piece += 1) {
      const seconds = tempo.pieceSeconds(stint("Heron", "280"));
      expect(seconds).toBeGreaterThan(standard * 0.4);
      expect(seconds).toBeLessThan(standard * 2.2);
    }
  });

  test("one operation drifts over its standard as the weeks go by, the others do not", () => {
    const slower = (code: string) =>
      mean(stint("Heron", code, { day: 60 })) / mean(stint("Heron", code));
    expect(slower(DRIFTING)).toBeGreaterThan(1.3);
    expect(slower("130")).toBeCloseTo(1);
  });

  test("the new model is learnt: every doubling of the pieces takes off the same share", () => {
    const tempo = tempoOf(randomFrom("learning"));
    const seconds = Array.from({ length: 64 }, () => tempo.pieceSeconds(stint(NEW_MODEL, "300")));
    const of = (from: number, to: number) => sum(seconds.slice(from, to)) / (to - from);
    expect(of(0, 4) / of(32, 64)).toBeGreaterThan(1.3);
    expect(of(8, 16)).toBeGreaterThan(of(32, 64));
  });

  test("the richer finish takes longer where it has more coats", () => {
    const rich = { option: "Sunburst gloss" };
    expect(mean(stint("Heron", "390", rich))).toBeGreaterThan(mean(stint("Heron", "390")) * 1.15);
    expect(mean(stint("Heron", "280", rich))).toBeCloseTo(mean(stint("Heron", "280")));
  });

  // Trade estimate of tests/checks/trade.json, rework-rates: 8 to 25 % of instruments come back in
  // finish; scrap overall 0.5 to 3 %.
  test("rework and scrap are as rare as in the trade", () => {
    const tempo = tempoOf(randomFrom("luck"));
    const routing = operations.filter(({ builds }) => builds.includes("flat-top"));
    const finish = routing.filter(({ stage }) => stage === "Finish");
    const lives = Array.from({ length: 3_000 }, () => ({
      reworked: finish.some(({ code }) => tempo.outcome(stint("Heron", code)) === "rework"),
      scrapped: routing.some(({ code }) => tempo.outcome(stint("Heron", code)) === "scrap"),
    }));
    const reworked = lives.filter((life) => life.reworked).length / lives.length;
    const scrapped = lives.filter((life) => life.scrapped).length / lives.length;
    expect(reworked).toBeGreaterThan(0.08);
    expect(reworked).toBeLessThan(0.25);
    expect(scrapped).toBeGreaterThan(0.005);
    expect(scrapped).toBeLessThan(0.03);
  });

  test("rework takes less than the work did, on the whole; make-ready takes some time", () => {
    const tempo = tempoOf(randomFrom("rework"));
    const rework = Array.from({ length: 200 }, () => tempo.reworkSeconds(stint("Heron", "410")));
    expect(sum(rework) / 200).toBeLessThan(16 * 60);
    expect(tempo.setupSeconds(stint("Heron", "100"))).toBeGreaterThan(300);
  });
});
