import { describe, expect, test } from "vitest";
import { cursorOf } from "@/lib/api/cursor";
import { ticketsQuery } from "@/lib/api/tickets";

describe("ticketsQuery", () => {
  test("takes nothing at all, or every filter", () => {
    expect(ticketsQuery.parse({})).toEqual({ limit: 100 });
    const filters = { status: "open", cell: "Neck", model: "Heron" };
    expect(ticketsQuery.parse({ ...filters, cursor: cursorOf(7), limit: "2" })).toEqual({
      ...filters,
      cursor: 7,
      limit: 2,
    });
  });
  test.each([
    [{ status: "late" }, "status"],
    [{ cell: "" }, "cell"],
    [{ model: "Her\0on" }, "model"],
    [{ cursor: cursorOf(-1) }, "cursor"],
    [{ limit: "501" }, "limit"],
  ])("refuses %j at %s", (query, path) => {
    expect(ticketsQuery.safeParse(query).error?.issues[0]?.path).toEqual([path]);
  });
  test("names a parameter that it does not know", () => {
    const [issue] = ticketsQuery.safeParse({ modell: "Heron" }).error?.issues ?? [];
    expect(issue).toMatchObject({ code: "unrecognized_keys", keys: ["modell"] });
  });
});
