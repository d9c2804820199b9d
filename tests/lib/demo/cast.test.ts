import { describe, expect, test } from "vitest";
import { cast } from "@/lib/demo/cast";
import { cells } from "@/lib/demo/cells";
import { isTrivialPin } from "@/lib/people/pin";

describe("cast", () => {
  test("are 64 people with names, numbers and PINs of their own", () => {
    expect(cast).toHaveLength(64);
    for (const key of ["name", "number", "pin"] as const) {
      expect(new Set(cast.map((person) => person[key])).size).toBe(64);
    }
  });

  test("have numbers and PINs that the product would give out", () => {
    for (const { number, pin } of cast) {
      expect(number).toMatch(/^\d{4}$/);
      expect(pin).toMatch(/^\d{6}$/);
      expect(isTrivialPin(pin, number)).toBe(false);
    }
  });

  test("every cell has people and somebody who leads it", () => {
    for (const { name } of cells) {
      expect(cast.filter(({ cell }) => cell === name).length).toBeGreaterThanOrEqual(3);
      expect(cast.filter(({ leads }) => leads.includes(name)).length).toBeGreaterThanOrEqual(1);
    }
  });

  test("nobody lends a hand in the own cell", () => {
    for (const { cell, also } of cast) expect(also).not.toContain(cell);
  });
});
