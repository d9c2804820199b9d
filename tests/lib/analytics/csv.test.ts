import { describe, expect, test } from "vitest";
import { cellLines, cellTotal } from "@/lib/analytics/cells";
import { cellsCsv, openedCsv, operationsCsv, overCsv, segmentsCsv } from "@/lib/analytics/csv";
import { linesOf, operationLines } from "@/lib/analytics/lines";
import { makeWorkRow } from "@/tests/make/work";

const how = { basis: "matched", places: 1 } as const;
const rows = [
  makeWorkRow("=1+1", { pieces: 2, earnedSeconds: 90, directSeconds: 100 }),
  makeWorkRow("020", { directSeconds: 60, noStandardSeconds: 60 }),
];
const body = (text: string) => text.split("\r\n").slice(1, -1);

describe("operationsCsv", () => {
  test("a ratio that is none is empty, and no text runs as a formula", () => {
    expect(body(operationsCsv(operationLines(rows, { ...how, operations: [] })))).toEqual([
      "'=1+1,,,,2,90,100,0,0,0,0.9000",
      "020,,,,0,0,60,60,0,0,",
    ]);
  });
});

describe("openedCsv", () => {
  test("its first column is by what it opened", () => {
    const text = openedCsv("week", linesOf(rows, how));
    expect(text.slice(1).split(",")[0]).toBe("week");
    expect(body(text)).toHaveLength(2);
  });
});

describe("segmentsCsv", () => {
  test("says when, what and where, and of nobody", () => {
    const segment = {
      startMs: 0,
      endMs: null,
      activity: "run",
      seconds: null,
      cell: null,
    } as const;
    expect(body(segmentsCsv([segment]))).toEqual(["1970-01-01T00:00:00.000Z,,run,,"]);
  });
});

describe("overCsv", () => {
  test("says by how much", () => {
    const over = { ticket: "26000017", operation: "010", standardSeconds: 10, actualSeconds: 25 };
    expect(body(overCsv([over]))).toEqual(["26000017,010,10,25,15"]);
  });
});

describe("cellsCsv", () => {
  test("ends with the sum of all", () => {
    const cells = [{ id: "020", name: "Mill" }];
    const lines = cellLines(rows, { cells, attendance: [] }, how);
    const found = body(cellsCsv(lines, cellTotal(rows, lines, how)));
    expect(found.map((row) => row.split(",")[0])).toEqual(["Mill", "All cells"]);
    expect(found[0]).toBe("Mill,0,0,0,0,0,0,0,0,60,60,0,0,,,,");
  });
});
