import { describe, expect, test } from "vitest";
import { cardsOf, type HoursRow } from "@/lib/hours/cards";

const row = (fields: Partial<HoursRow> = {}): HoursRow => ({
  number: "1042",
  name: "Ilo Varn",
  cell: "Neck",
  date: "2026-05-14",
  activity: "run",
  seconds: 3600,
  ...fields,
});

describe("cardsOf", () => {
  test("gathers days in order, and what each was", () => {
    const [card] = cardsOf([
      row({ activity: "meal", seconds: 1800 }),
      row({ date: "2026-05-13", activity: "indirect", seconds: 900 }),
      row(),
    ]);
    expect(card!.days.map(({ date, sums }) => [date, sums.attendedSeconds])).toEqual([
      ["2026-05-13", 900],
      ["2026-05-14", 3600],
    ]);
    expect(card!.total).toMatchObject({
      attendedSeconds: 4500,
      directSeconds: 3600,
      indirectSeconds: 900,
      mealSeconds: 1800,
    });
    expect(card!.decimals.total).toMatchObject({ attended: 125, direct: 100, meal: 50 });
  });

  test("people keep their order, and one without any time has a card of nothing", () => {
    const none = { date: null, activity: null, seconds: 0 };
    const cards = cardsOf([row({ number: "9" }), row({ number: "8", ...none })]);
    expect(cards.map(({ number, days }) => [number, days.length])).toEqual([
      ["9", 1],
      ["8", 0],
    ]);
  });
});
