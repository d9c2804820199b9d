import { expect, test } from "vitest";
import { say } from "./say";

/** Plays each scenario under its guarantee; all that comes of it must be in the table, and only that. */
export function plays(scenarios: Record<string, string>): void {
  test.each(Object.entries(scenarios))("%s", (_, table) => {
    const { rows, expected } = say(table);
    expect(rows).toEqual(expected);
  });
}
