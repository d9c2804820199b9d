import { describe, expect, test } from "vitest";
import type { Asked } from "@/lib/ledger/asked";
import { askedTogether, fitTogether, ownContext, type ReadTogether } from "@/lib/ledger/together";
import {
  LEAD_ID,
  LEAD_SESSION,
  makeContext,
  makeWindow,
  SESSION,
  WORKER_ID,
} from "@/tests/make/context";

const asked = (other: Partial<Asked>): Asked => ({
  kioskId: "k1",
  numbers: [],
  sessions: [],
  ids: [],
  touched: [],
  targets: [],
  items: [],
  benchAtMs: null,
  ...other,
});

describe("askedTogether", () => {
  test("asks once for each kiosk, person and session, and for every record", () => {
    const together = askedTogether([
      asked({ numbers: ["1"], sessions: ["s"], ids: ["a"], benchAtMs: 5 }),
      asked({ kioskId: "k2", numbers: ["1", "2"], sessions: ["s", "t"], ids: ["b"], benchAtMs: 7 }),
      asked({ kioskId: null, touched: [{ number: "3", atMs: 1 }] }),
    ]);
    expect(together).toMatchObject({
      kioskIds: ["k1", "k2"],
      numbers: ["1", "2", "3"],
      sessions: ["s", "t"],
      ids: ["a", "b"],
      touched: [{ number: "3", atMs: 1 }],
      benchAtMs: 7,
    });
    expect(askedTogether([asked({})]).benchAtMs).toBeNull();
  });
});

describe("ownContext", () => {
  const context = makeContext();
  const read: ReadTogether = {
    ...context,
    sessions: context.sessions.map((session, at) => ({ ...session, kioskId: `k${at + 1}` })),
    served: [
      { kioskId: "k1", cellId: "mill", fromMs: 0, position: 0 },
      { kioskId: "k2", cellId: "neck", fromMs: 0, position: 0 },
    ],
    windows: [makeWindow(), makeWindow({ workerId: LEAD_ID })],
    next: new Map([["k1", []]]),
  };

  test("has the sessions, cells and timelines of the batch's own kiosk and people", () => {
    const own = ownContext(read, asked({ numbers: ["1042"], sessions: [SESSION] }));
    expect(own.sessions.map(({ id }) => id)).toEqual([SESSION]);
    expect(own.served.map(({ cellId }) => cellId)).toEqual(["mill"]);
    expect(own.windows.map(({ workerId }) => workerId)).toEqual([WORKER_ID]);
  });

  test("a session proves nothing on another kiosk, also where that one asks for it too", () => {
    expect(ownContext(read, asked({ sessions: [SESSION, LEAD_SESSION] })).sessions).toHaveLength(1);
    expect(ownContext(read, asked({ kioskId: "k2", sessions: [SESSION] })).sessions).toEqual([]);
  });

  test("has the timeline of whoever opened one of its sessions", () => {
    const own = ownContext(read, asked({ kioskId: "k2", sessions: [LEAD_SESSION] }));
    expect(own.windows.map(({ workerId }) => workerId)).toEqual([LEAD_ID]);
    expect(own.next).toEqual([]);
  });
});

describe("fitTogether", () => {
  const batch = (kioskId: string, worker: string, id: string, isTouched = true) => ({
    kioskId,
    // safe because only these fields are read
    timelines: [{ workerId: worker, isTouched } as never],
    rows: [{ id } as never],
  });

  test("lets apart what meets in a kiosk, a worker or a record, and the first always goes", () => {
    expect(
      fitTogether([
        batch("k1", "w1", "a"),
        batch("k1", "w2", "b"),
        batch("k2", "w1", "c"),
        batch("k3", "w3", "a"),
        batch("k4", "w4", "d"),
      ]),
    ).toEqual([true, false, false, false, true]);
  });

  test("whose timeline is only looked at may be written by another", () => {
    expect(fitTogether([batch("k1", "w1", "a"), batch("k2", "w1", "b", false)])).toEqual([
      true,
      true,
    ]);
  });

  test("what had to wait takes nobody's place", () => {
    expect(
      fitTogether([batch("k1", "w1", "a"), batch("k1", "w2", "b"), batch("k3", "w2", "c")]),
    ).toEqual([true, false, true]);
  });
});
