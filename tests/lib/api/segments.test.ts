import { describe, expect, test } from "vitest";
import { cursorOf } from "@/lib/api/cursor";
import { segmentsQuery } from "@/lib/api/segments";

const position = {
  day: "2026-03-02",
  worker: "01890a5d-ac96-774b-bcce-b302099a8057",
  start: 1_772_400_000,
  item: 0,
};

describe("segmentsQuery", () => {
  test("takes site dates and a position", () => {
    const days = { from: "2026-03-01", to: "2026-03-08" };
    expect(segmentsQuery.parse({ ...days, cursor: cursorOf(position) })).toEqual({
      ...days,
      cursor: position,
      limit: 100,
    });
  });
  test.each([
    [{ from: "2026-02-30" }, "from"],
    [{ from: "9999-12-30" }, "from"],
    [{ cell: "\0" }, "cell"],
    [{ to: "2026-03-02T00:00:00Z" }, "to"],
    [{ cursor: cursorOf({ ...position, worker: "1042" }) }, "cursor"],
    [{ cursor: cursorOf({ ...position, start: 9e15 }) }, "cursor"],
    [{ cursor: cursorOf({ ...position, item: 40_000 }) }, "cursor"],
    [{ cursor: cursorOf(7) }, "cursor"],
  ])("refuses %j at %s", (query, path) => {
    expect(segmentsQuery.safeParse(query).error?.issues[0]?.path).toEqual([path]);
  });
});
