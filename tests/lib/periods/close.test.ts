import { describe, expect, test } from "vitest";
import { decideClose } from "@/lib/periods/close";

const worker = (id: string) => ({
  id,
  number: "1",
  name: `N ${id}`,
  cell: "Mill",
  payrollNumber: null,
});
const card = (id: string, state: "agreed" | "to look at") => ({ worker: worker(id), state });
const facts = {
  isClosed: false,
  closedBy: null,
  isOver: true,
  hasPolicy: true,
  openBefore: null,
  cards: [card("a", "agreed"), card("b", "to look at")],
};
const named = { named: ["b"], reason: "bank day" };
const said = (change: Partial<typeof facts> | object, asked = named) => {
  const answer = decideClose({ ...facts, ...change }, asked);
  return answer.ok ? [...answer.value] : answer.problem.detail;
};

describe("decideClose", () => {
  test("what is open is closed by name, with the reason; what is agreed needs none", () => {
    expect(said({})).toEqual([["b", "bank day"]]);
    expect(said({ cards: [card("a", "agreed")] }, { named: [], reason: "" })).toEqual([]);
  });
  test("a name that was agreed meanwhile needs no reason any more", () => {
    expect(said({ cards: [card("b", "agreed")] })).toEqual([]);
  });
  test.each([
    [
      { isClosed: true, closedBy: "Ada" },
      "Ada has closed this period already. Nothing was changed.",
    ],
    [{ hasPolicy: false }, "Choose a pay policy for the site first."],
    [{ isOver: false }, "This period still runs. Close it when it is over."],
    [
      { openBefore: "2026-05-17" },
      "The period from 2026-05-17 is still open. Close that one first.",
    ],
  ])("%j: %s", (change, detail) => expect(said(change)).toBe(detail));
  test("one who is not named stays a question, by name", () => {
    expect(said({}, { named: ["a"], reason: "x" })).toBe(
      "Still to look at: N b. Settle it, or close by name.",
    );
    const many = ["b", "c", "d", "e", "f", "g", "h"].map((id) => card(id, "to look at"));
    expect(said({ cards: many }, { named: [], reason: "" })).toContain("N f and 2 more.");
  });
  test("a name without a reason is refused", () => {
    expect(said({}, { named: ["b"], reason: "  " })).toBe(
      "Say why they are closed with something open.",
    );
  });
});
