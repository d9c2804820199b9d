import { describe, expect, test } from "vitest";
import { cardState, isSignedByWorker } from "@/lib/agreement/card-state";

const signed = { atMs: 1, by: "lead" };
const both = { agreement: { worker: { atMs: 1, by: null }, lead: signed, hasLapsed: false } };
const lead = { agreement: { worker: null, lead: signed, hasLapsed: false } };
const self = { agreement: { worker: { atMs: 1, by: null }, lead: null, hasLapsed: false } };
const runs = { agreement: null };

describe("cardState", () => {
  test.each([
    { days: [both, lead], openEnds: 0, isClosed: false, is: "agreed" },
    { days: [], openEnds: 0, isClosed: false, is: "agreed" },
    { days: [both, self], openEnds: 0, isClosed: false, is: "to look at" },
    { days: [both, runs], openEnds: 0, isClosed: false, is: "to look at" },
    { days: [both], openEnds: 1, isClosed: false, is: "to look at" },
    { days: [], openEnds: 1, isClosed: false, is: "to look at" },
    { days: [self], openEnds: 1, isClosed: true, is: "closed" },
  ] as const)("$days.length days, $openEnds open, closed $isClosed: $is", ({ is, ...facts }) => {
    expect(cardState(facts)).toBe(is);
  });
});

describe("isSignedByWorker", () => {
  test("asks for every day, and for one at least", () => {
    expect(isSignedByWorker({ days: [both, self] })).toBe(true);
    expect(isSignedByWorker({ days: [both, lead] })).toBe(false);
    expect(isSignedByWorker({ days: [both, runs] })).toBe(false);
    expect(isSignedByWorker({ days: [] })).toBe(false);
  });
});
