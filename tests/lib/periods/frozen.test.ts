import { describe, expect, test } from "vitest";
import { payFile } from "@/lib/periods/file";
import { payFileOf, totalsOfFile } from "@/lib/periods/frozen";
import { EARLIER, makeDay, makeFrozen, makeFrozenCard, PERIOD } from "@/tests/make/frozen";

const days = [makeDay("2026-06-01", 36_000), makeDay("2026-06-05", 14_400, { overtime: 21_600 })];

describe("payFileOf", () => {
  test("is the file that the contract describes", () => {
    const file = payFileOf(makeFrozen(days));
    expect(payFile.parse(file)).toEqual(file);
    expect(file.people[0]).toMatchObject({
      worker: "1042",
      payrollNumber: "71042",
      paidSeconds: 72_000,
      hours: { paid: "20.00", regular: "14.00", overtime: "6.00" },
    });
  });
  test("an adjustment stands apart from the days, with its reference, and in the sums", () => {
    const frozen = makeFrozen(days);
    const change = { ...makeDay("2026-05-20", -3600), workerId: "w1", aboutId: EARLIER };
    const file = payFileOf({
      ...frozen,
      days: [...frozen.days, { ...change, aboutFrom: "2026-05-17" }],
    });
    const [person] = file.people;
    expect(person!.days).toHaveLength(2);
    expect(person!.adjustments).toMatchObject([
      { reference: "2026-05-17/2026-05-20", period: EARLIER, paidSeconds: -3600 },
    ]);
    expect(person!.hours.paid).toBe("19.00");
    expect(file.totals.hours.paid).toBe("19.00");
  });
  test("who has nothing is named beside the file, and so is who was closed with a question", () => {
    const cards = [
      makeFrozenCard({ reason: "bank day" }),
      makeFrozenCard({ workerId: "w2", number: "1043", name: "Oda Brenn" }),
    ];
    const { people, totals } = payFileOf(makeFrozen(days, { cards }));
    expect(people).toHaveLength(1);
    expect(totals).toMatchObject({
      headcount: 1,
      withoutHours: [{ worker: "1043", name: "Oda Brenn" }],
      closedWithQuestions: [{ worker: "1042", name: "Ilo Varn", reason: "bank day" }],
    });
  });
  test("a period in which nobody worked has a file too", () => {
    expect(payFileOf(makeFrozen([], { cards: [] })).totals).toMatchObject({
      headcount: 0,
      hours: { paid: "0.00" },
    });
  });
});

describe("totalsOfFile", () => {
  test("is what stands beside the file that is made later", () => {
    const frozen = makeFrozen(days);
    const rows = frozen.days.map(({ aboutFrom, ...day }) => ({ ...day, trail: [] }));
    expect(totalsOfFile(PERIOD.id, frozen.cards, rows)).toEqual(payFileOf(frozen).totals);
  });
});
