import { describe, expect, test } from "vitest";
import { handOverOf, type SaidEvent, saidActs, tapsOf } from "@/lib/sheet/taps";
import { makeSaidAct, steps } from "@/tests/make/sheet";

const item = { ticket: "26048176", operation: "495" };
const other = { ticket: "26048176", operation: "500" };

describe("tapsOf", () => {
  test("only the operation's own, in order, by whomever, with the weight of their booking", () => {
    const acts = [
      makeSaidAct(9, { kind: "step-done", ...item, step: "2" }, { weights: [345] }),
      makeSaidAct(4, { kind: "step-done", ...item, step: "1" }, { worker: "1077" }),
      makeSaidAct(5, { kind: "step-done", ...other, step: "1" }),
      makeSaidAct(6, { kind: "work", activity: "run", items: [item] }),
    ];
    expect(tapsOf(acts, item, steps)).toMatchObject([
      { step: "1", kind: "done", worker: "1077", weight: 480 },
      { step: "2", kind: "done", worker: "1042", weight: 345 },
    ]);
  });
  test("what is taken back and what does not apply, with its word", () => {
    const acts = [
      makeSaidAct(1, { kind: "step-open", ...item, step: "1" }),
      makeSaidAct(2, { kind: "step-skip", ...item, step: "9" }, { note: "not-on-this" }),
    ];
    expect(tapsOf(acts, item, steps)).toMatchObject([
      { step: "1", kind: "open", reason: null },
      { step: "9", kind: "skip", reason: "not-on-this", weight: 1 },
    ]);
  });
});

describe("handOverOf", () => {
  const handed = makeSaidAct(
    10,
    { kind: "hand-over", ...item, to: "1077" },
    { note: "shift-ends", atMs: 600_400 },
  );

  test("waits until the colleague works on it, or whoever gave it away does again", () => {
    const before = [
      { start: 0, worker: "1042" },
      { start: 900, worker: "1090" },
    ];
    expect(handOverOf([handed], item, before)).toEqual({
      event: "act-10",
      from: "1042",
      to: "1077",
      atMs: 600_400,
      reason: "shift-ends",
    });
    for (const worker of ["1077", "1042"]) {
      expect(handOverOf([handed], item, [...before, { start: 600, worker }])).toBeNull();
    }
  });
  test("the last one counts, and that of another operation does not", () => {
    const again = makeSaidAct(12, { kind: "hand-over", ...item, to: "1080" });
    expect(handOverOf([again, handed], item, [])?.to).toBe("1080");
    expect(handOverOf([handed], other, [])).toBeNull();
    expect(handOverOf([], item, [])).toBeNull();
  });
});

describe("saidActs", () => {
  const done = makeSaidAct(4, { kind: "step-done", ...item, step: "1" });
  const said = (...events: SaidEvent[]) => tapsOf(saidActs(events), item, steps);

  test("what is undone within 10 s is gone, by its own worker only", () => {
    const undo = makeSaidAct(4, { kind: "undo", event: done.id }, { id: "undo", seq: 5 });
    expect(said(done, undo)).toEqual([]);
    expect(said(done, { ...undo, worker: "1077" })).toHaveLength(1);
  });
  test("what a lead voids is gone, what a lead moves counts at its new time", () => {
    const by = { by: "2001", id: "lead", atMs: 9_000_000 };
    expect(said(done, makeSaidAct(9, { kind: "void", event: done.id }, by))).toEqual([]);
    const to = "1970-01-01T00:02:00Z";
    expect(said(done, makeSaidAct(9, { kind: "move", event: done.id, to }, by))).toMatchObject([
      { step: "1", atMs: 120_000 },
    ]);
  });
  test("a step that a lead enters for somebody counts when it was, with the lead's word", () => {
    const event = { ...item, kind: "step-skip", step: "2", at: "1970-01-01T00:03:00Z" };
    const entered = makeSaidAct(9, { kind: "insert", event }, { by: "2001", note: "left-out" });
    expect(said(entered)).toMatchObject([
      { kind: "skip", step: "2", atMs: 180_000, reason: "left-out" },
    ]);
  });
});
