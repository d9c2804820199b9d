import { describe, expect, test } from "vitest";
import { benchView } from "@/lib/bench/view";
import {
  isSameItem,
  keyOf,
  record,
  recordAs,
  refuse,
  show,
  still,
  toBench,
  toDoor,
} from "@/lib/taps/moves";
import { HERON, TestKiosk, WREN } from "@/tests/make/bench";

const bench = () => TestKiosk.atBench().state;

describe("moves between screens", () => {
  test("standing still changes nothing and asks for nothing", () => {
    const state = bench();
    expect(still(state)).toEqual([state, []]);
  });

  test("another screen ends a look-up that was for the last one", () => {
    const finding = { code: HERON, purpose: { for: "work" } as const };
    const [next] = show({ ...bench(), finding }, { at: "break" });
    expect(next).toMatchObject({ screen: { at: "break" }, finding: null });
  });

  test("a no is heard", () => {
    expect(refuse(bench(), { at: "break" })[1]).toEqual([{ do: "sound", sound: "refuse" }]);
  });

  test("the door signs out and forgets the language that was chosen", () => {
    expect(toDoor({ ...bench(), language: "es" })[0]).toMatchObject({
      screen: { at: "door", digits: "" },
      visit: null,
      language: null,
    });
  });

  test("a bench without an open shift offers its start", () => {
    const out = TestKiosk.atDoor().signIn().state;
    expect(toBench(out, benchView)[0].screen.at).toBe("start-shift");
    expect(toBench(bench(), benchView)[0].screen.at).toBe("bench");
    expect(toBench({ ...bench(), visit: null }, benchView)[0].screen.at).toBe("door");
  });

  test("an act is recorded for the visitor's session, and for nobody without one", () => {
    const state = bench();
    const [saving, effects] = record(state, { what: "object" }, { kind: "shift-start" });
    expect(saving.saving).toMatchObject({ worker: "1042", deed: { what: "object" } });
    expect(effects).toMatchObject([{ do: "record", bodies: [{ kind: "shift-start" }] }]);
    const gone = record({ ...state, sessions: {} }, { what: "object" }, { kind: "shift-start" });
    expect(gone[0].screen.at).toBe("door");
    expect(gone[1]).toEqual([]);
  });

  test("an act of somebody who left is recorded for the session it is said to be of", () => {
    const who = { worker: "7", session: "s" };
    const [next, effects] = recordAs(bench(), { what: "undo" }, who, [{ kind: "shift-start" }]);
    expect(next.saving).toEqual({ deed: { what: "undo" }, ...who });
    expect(effects).toMatchObject([{ do: "record", ...who }]);
  });
});

describe("isSameItem", () => {
  test("needs both the ticket and the operation", () => {
    const item = { ticket: HERON, operation: "120" };
    expect(isSameItem(item, { ...item })).toBe(true);
    expect(isSameItem(item, { ...item, ticket: WREN })).toBe(false);
    expect(isSameItem(item, { ...item, operation: "130" })).toBe(false);
  });
});

describe("keyOf", () => {
  test("leaves out what is not the key", () => {
    const item = { ticket: HERON, operation: "120", weight: 4 };
    expect(keyOf(item)).toEqual({ ticket: HERON, operation: "120" });
  });
});
