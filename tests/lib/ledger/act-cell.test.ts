import { describe, expect, test } from "vitest";
import { actCell, cellsServedAt } from "@/lib/ledger/act-cell";

describe("cellsServedAt", () => {
  const served = [
    { cellId: "neck", fromMs: 100, position: 1 },
    { cellId: "mill", fromMs: 100, position: 0 },
    { cellId: "spray", fromMs: 200, position: 0 },
  ];
  test.each([
    [99, ["mill", "neck"], "older than all rows: the first ones"],
    [100, ["mill", "neck"], "from the very instant on"],
    [199, ["mill", "neck"], "until the next"],
    [200, ["spray"], "all that came with the latest instant, and only that"],
  ])("at %d: %j (%s)", (atMs, cells) => expect(cellsServedAt(served, atMs)).toEqual(cells));

  test("a kiosk without cells serves none", () => expect(cellsServedAt([], 5)).toEqual([]));
});

describe("actCell", () => {
  test.each<[string[], string | null, boolean, string | null, string]>([
    [["mill", "neck"], "neck", false, "neck", "the operation's, where the kiosk serves it"],
    [["mill", "neck"], "spray", false, "mill", "else the kiosk's first: borrowed hands count here"],
    [["mill"], null, false, "mill", "an act without operation"],
    [["mill"], "spray", true, "spray", "a lead's entry: the operation's, wherever it was made"],
    [["mill"], null, true, null, "a lead's entry without operation: the fold says"],
    [[], "spray", false, "spray", "a kiosk without cells: the operation's"],
    [[], null, false, null, "nothing to tell by"],
  ])("%j, operation of %s, by a lead %s: %s (%s)", (served, operationCell, isByLead, cell) => {
    expect(actCell({ served, operationCell, isByLead })).toBe(cell);
  });
});
