import { describe, expect, test } from "vitest";
import type { Item } from "@/lib/ledger/schema";
import { openPieces, standardOf, stepWeight, WEIGHT_MAX, weigh } from "@/lib/ledger/weigh";
import { makeFacts, RECEIVED_MS } from "@/tests/make/context";
import { siteRules } from "@/tests/make/events";

const around = { rules: [siteRules], atMs: RECEIVED_MS };
const item = (operation: string, weight?: number): Item =>
  weight === undefined
    ? { ticket: "26000017", operation }
    : { ticket: "26000017", operation, weight };

describe("openPieces", () => {
  test.each([
    [{ quantity: 8 }, 8],
    [{ quantity: 8, earlierScrap: 2, good: 3, scrap: 1 }, 2],
    [{ quantity: 8, good: 9 }, 0],
  ])("%j leaves %d", (facts, open) => expect(openPieces(makeFacts(facts))).toBe(open));
});

describe("standardOf", () => {
  const rows = [
    { seq: 1, option: null, effectiveFrom: "2026-01-01", setupSeconds: 600, runSeconds: 1800 },
    { seq: 2, option: null, effectiveFrom: "2026-05-14", setupSeconds: 500, runSeconds: 1500 },
    { seq: 3, option: "sunburst", effectiveFrom: "2026-01-01", setupSeconds: 60, runSeconds: 300 },
  ];
  const before = Date.UTC(2026, 4, 13, 12);

  test("holds from the day of its first work on, with the adders of the ticket's options", () => {
    const standard = (facts: object) =>
      standardOf(makeFacts({ standards: rows, ...facts }), [siteRules], RECEIVED_MS)?.runSeconds;
    expect(standard({})).toBe(1800);
    expect(standard({ firstWorkMs: before })).toBe(2100);
    expect(standard({ firstReportMs: before })).toBe(2100);
    expect(standard({ firstWorkMs: RECEIVED_MS, firstReportMs: before })).toBe(1800);
  });

  test("is null where none is set", () => {
    expect(standardOf(makeFacts({ standards: [] }), [siteRules], RECEIVED_MS)).toBeNull();
  });
});

describe("weigh", () => {
  const lot = makeFacts({ quantity: 4, good: 1 });
  const single = makeFacts({ operation: "020" });
  const known = [lot, single];
  const factsOf = ({ operation }: Item) => known.find((one) => one.operation === operation);

  test("weighs by what is left to do: run for the open pieces, setup until it is earned", () => {
    expect(weigh([item("010"), item("020")], factsOf, around)).toEqual([3 * 1800, 600 + 1800]);
  });

  test("takes the kiosk's own weight where it sends one", () => {
    expect(weigh([item("010", 7), item("020")], factsOf, around)).toEqual([7, 2400]);
  });

  test("gives an unknown operation the mean of the others, and equal weights where all are", () => {
    expect(weigh([item("020"), item("999")], factsOf, around)).toEqual([2400, 2400]);
    expect(weigh([item("998"), item("999")], factsOf, around)).toEqual([1, 1]);
  });

  test("never weighs more than 200 items can share exactly", () => {
    expect(weigh([item("010", 1_000_000_000)], factsOf, around)).toEqual([WEIGHT_MAX]);
    expect(Number.isSafeInteger(200 * WEIGHT_MAX * 36 * 3600)).toBe(true);
  });

  test("weighs nothing where there is nothing", () => {
    expect(weigh([], factsOf, around)).toEqual([]);
  });
});

describe("stepWeight", () => {
  const facts = makeFacts({ steps: [{ step: "1", seconds: 480 }] });
  const ref = { ticket: "26000017", operation: "010" };

  test("a step that is tapped off weighs what it takes, an unknown one nothing", () => {
    expect(stepWeight({ kind: "step-done", ...ref, step: "1" }, facts)).toEqual([480]);
    expect(stepWeight({ kind: "step-done", ...ref, step: "2" }, facts)).toBeNull();
    expect(stepWeight({ kind: "step-done", ...ref, step: "1" }, undefined)).toBeNull();
  });

  test("what is taken back or left out has no weight", () => {
    expect(stepWeight({ kind: "step-open", ...ref, step: "1" }, facts)).toBeNull();
    expect(stepWeight({ kind: "step-skip", ...ref, step: "1" }, facts)).toBeNull();
  });
});
