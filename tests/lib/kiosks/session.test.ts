import { describe, expect, test } from "vitest";
import { isSessionOver } from "@/lib/kiosks/session";

const HOUR = 3_600_000;
const ended = (end: number) => [{ end, endEvent: "e" }];

describe("isSessionOver", () => {
  test.each<[string, number, { end: number | null; endEvent: string | null }[], boolean, string]>([
    ["run", 16 * HOUR, [], false, "16 hours to the millisecond"],
    ["run", 16 * HOUR + 1, [], true, "no longer"],
    ["run", 5000, ended(4), true, "after the second in which its worker's shift ended"],
    ["run", 4999, ended(4), false, "within that second"],
    ["undo", 14_999, ended(4), false, "an undo, ten seconds longer"],
    ["undo", 15_000, ended(4), true, "and then no more"],
    ["confirm", 14_999, ended(4), false, "an agreement too"],
    ["run", 5000, ended(0), false, "a shift that had ended before it was opened"],
    ["run", 5000, [{ end: 4, endEvent: null }], false, "a shift that nobody ended"],
    ["run", 5000, [{ end: null, endEvent: null }], false, "a shift that runs"],
  ])("%s at %d ms: %s", (kind, atMs, shifts, isOver) => {
    expect(isSessionOver({ openedMs: 0 }, { atMs, kind }, shifts)).toBe(isOver);
  });

  test("ends where it was ended by hand", () => {
    const session = { openedMs: 0, endedMs: 1000 };
    expect(isSessionOver(session, { atMs: 1000, kind: "run" }, [])).toBe(false);
    expect(isSessionOver(session, { atMs: 1001, kind: "run" }, [])).toBe(true);
  });
});
