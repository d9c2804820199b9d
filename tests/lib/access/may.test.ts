import { describe, expect, test } from "vitest";
import { type Action, cellsOf, permissions, reachOf } from "@/lib/access/may";
import { role, roles } from "@/lib/access/roles";

const lead = (...cells: string[]) => ({ role: "lead" as const, cells });
const plain = (name: (typeof roles)[number]) => ({ role: name, cells: [] });

describe("reachOf", () => {
  test("is nothing for nobody, whatever the action", () => {
    for (const action of Object.keys(permissions) as Action[])
      expect(reachOf([], action), action).toBeNull();
  });
  test("takes the widest that any of one's roles has", () => {
    expect(reachOf([plain("worker")], "hours.see")).toBe("self");
    expect(reachOf([plain("worker"), lead("frets")], "hours.see")).toBe("cells");
    expect(reachOf([lead("frets"), plain("payroll")], "hours.see")).toBe("site");
  });
  test("keeps a worker out of the office's pages", () => {
    const open = (Object.keys(permissions) as Action[]).filter(
      (action) => reachOf([plain("worker")], action) !== null,
    );
    expect(open.every((action) => reachOf([plain("worker")], action) === "self")).toBe(true);
  });
  test("lets only payroll read a person's name beside a segment", () => {
    const named = roles.filter((name) => reachOf([plain(name)], "segments.name-people"));
    expect(named).toEqual(["payroll"]);
  });
});

describe("cellsOf", () => {
  test("gathers the cells that someone leads, each once", () => {
    expect(cellsOf([lead("frets", "spray"), lead("spray"), plain("admin")])).toEqual([
      "frets",
      "spray",
    ]);
  });
  test("is empty for who leads none", () => expect(cellsOf([plain("planner")])).toEqual([]));
});

describe("role", () => {
  test("is one of the table's, spelled as it is", () => {
    expect(role.safeParse("Lead").success).toBe(false);
    expect(role.parse("lead")).toBe("lead");
  });
});
