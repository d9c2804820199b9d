import { describe, expect, test } from "vitest";
import { homeFor, roomsFor } from "@/lib/access/rooms";

const held = (role: "admin" | "payroll" | "worker" | "lead" | "planner") => [{ role, cells: [] }];
const names = (role: Parameters<typeof held>[0]) => roomsFor(held(role)).map(({ name }) => name);

describe("roomsFor", () => {
  test("shows each role its own rooms only", () => {
    expect(names("admin")).toEqual(["People", "Tickets", "Kiosks", "Floor", "Seam", "Loose ends"]);
    expect(names("payroll")).toEqual(["People", "Floor", "Loose ends", "Hours"]);
    expect(names("planner")).toEqual(["Tickets", "Standards", "Floor", "Seam"]);
    expect(names("worker")).toEqual(["Hours"]);
    expect(roomsFor([])).toEqual([]);
  });
});

describe("homeFor", () => {
  test("is the floor, for a worker the own hours, for nobody the own account", () => {
    expect(homeFor(held("lead"))).toBe("/floor");
    expect(homeFor(held("worker"))).toBe("/me");
    expect(homeFor([])).toBe("/account");
  });
});
