import { describe, expect, test } from "vitest";
import { cellsAnswerOf, operationsAnswerOf } from "@/lib/analytics/answer";
import { cellLines, cellTotal } from "@/lib/analytics/cells";
import { operationLines } from "@/lib/analytics/lines";
import { cellsAnswer, operationsAnswer } from "@/lib/analytics/schema";
import { makeWorkRow } from "@/tests/make/work";

const how = { basis: "matched", places: 1 } as const;

describe("operationsAnswerOf", () => {
  const rows = [
    makeWorkRow("010", { pieces: 2, earnedSeconds: 90, directSeconds: 100, reworkSeconds: 9 }),
    makeWorkRow("020", { pieces: 1, directSeconds: 60, noStandardSeconds: 60 }),
  ];
  const operations = [{ code: "010", name: "Plane", stage: "Timber", cell: "Mill" }];
  const answer = operationsAnswerOf(operationLines(rows, { ...how, operations }));

  test("an operation without a standard has neither a standard nor an efficiency", () => {
    expect(operationsAnswer.strict().parse(answer).items).toEqual([
      {
        operation: "010",
        stage: "Timber",
        cell: "Mill",
        finished: 2,
        standardSeconds: 90,
        actualSeconds: 100,
        noStandardSeconds: 0,
        reworkSeconds: 9,
        efficiency: 0.9,
      },
      {
        operation: "020",
        stage: null,
        cell: null,
        finished: 1,
        standardSeconds: null,
        actualSeconds: 60,
        noStandardSeconds: 60,
        reworkSeconds: 0,
        efficiency: null,
      },
    ]);
  });
  test("totals are sums, and the ratio of sums", () => {
    expect(answer.totals).toMatchObject({ finished: 3, actualSeconds: 160, efficiency: 0.9 });
  });
  test("nothing is nothing: 0, and no ratio", () => {
    expect(operationsAnswerOf([]).totals).toMatchObject({ standardSeconds: 0, efficiency: null });
  });
});

describe("cellsAnswerOf", () => {
  test("names both bases, and efficiency of the chosen one", () => {
    const rows = [
      makeWorkRow("mill", { earnedSeconds: 40, directSeconds: 50 }),
      makeWorkRow("mill", { earnedSeconds: 30, directSeconds: 60 }, { basis: "booked" }),
    ];
    const time = { directSeconds: 60, reworkSeconds: 1, indirectSeconds: 2, restSeconds: 3 };
    const attendance = [{ place: 0, cell: "mill", ...time, unassignedSeconds: 4, mealSeconds: 5 }];
    const lines = cellLines(rows, { cells: [{ id: "mill", name: "Mill" }], attendance }, how);
    const answer = cellsAnswerOf(lines, cellTotal(rows, lines, how));
    expect(cellsAnswer.strict().parse(answer).items).toEqual([
      {
        cell: "Mill",
        attendanceSeconds: 69,
        directSeconds: 60,
        indirectSeconds: 2,
        reworkSeconds: 1,
        restSeconds: 3,
        mealSeconds: 5,
        unassignedSeconds: 4,
        earnedSeconds: 30,
        matchedEarnedSeconds: 40,
        matchedActualSeconds: 50,
        noStandardSeconds: 0,
        efficiency: 0.8,
        utilization: 60 / 69,
        productivity: 30 / 69,
      },
    ]);
    expect(answer.totals).toMatchObject({ attendanceSeconds: 69, matchedEarnedSeconds: 40 });
  });
});
