import { describe, expect, test } from "vitest";
import { periodViewOf } from "@/lib/periods/period-view";
import { PERIOD } from "@/tests/make/frozen";

const closed = {
  ...PERIOD,
  revision: 1,
  isClosed: true,
  closedAt: new Date("2026-06-15T15:00:00Z"),
  closedBy: "Winifred Ashgrove",
  digest: "a".repeat(64),
  totals: null,
};

describe("periodViewOf", () => {
  test("tells a closing with its moment, author and digest", () => {
    expect(periodViewOf(closed)).toMatchObject({
      status: "closed",
      closedAt: "2026-06-15T15:00:00.000Z",
      closedBy: "Winifred Ashgrove",
    });
  });
  test("of one that was reopened only the number is told", () => {
    expect(periodViewOf({ ...closed, isClosed: false })).toMatchObject({
      status: "open",
      revision: 1,
      closedAt: null,
      closedBy: null,
      digest: null,
    });
  });
});
