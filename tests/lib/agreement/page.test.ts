import { describe, expect, test } from "vitest";
import type { CardDay } from "@/lib/agreement/card";
import { type CardRead, cardLines } from "@/lib/agreement/page";

const digest = "a".repeat(64);
const signature = { atMs: 1, by: "Ada Berg" };

function day(date: string, other: Partial<CardDay> = {}): CardDay {
  const open = { worker: null, lead: null, hasLapsed: false };
  const bounds = { startMs: 0, endMs: 1, parts: [], runs: false };
  return { date, presentSeconds: 3600, digest, agreement: open, ...bounds, ...other };
}
function card(other: Partial<CardRead> = {}): CardRead {
  return {
    number: "1042",
    name: "Ilo Varn",
    cell: "Mill",
    days: [day("2026-05-11"), day("2026-05-12")],
    plannedSeconds: 7200,
    openEnds: 0,
    isClosed: false,
    ...other,
  };
}
const byLead = { worker: null, lead: signature, hasLapsed: false };

describe("cardLines", () => {
  test("a card to look at names the days that the lead may agree to", () => {
    const { toLookAt } = cardLines([card()]);
    expect(toLookAt).toMatchObject([
      {
        state: "to look at",
        presentSeconds: 7200,
        toAgree: [`1042 2026-05-11 ${digest}`, `1042 2026-05-12 ${digest}`],
      },
    ]);
  });

  test("days that run or are agreed to are not offered", () => {
    const runs = day("2026-05-13", { digest: null, agreement: null, runs: true });
    const days = [day("2026-05-11", { agreement: byLead }), day("2026-05-12"), runs];
    expect(cardLines([card({ days })]).toLookAt[0]).toMatchObject({
      toAgree: [`1042 2026-05-12 ${digest}`],
      runningDays: 1,
      isSignedByLead: false,
    });
  });

  test("an agreed card stands apart, also before the worker has signed", () => {
    const days = [day("2026-05-11", { agreement: byLead })];
    const { toLookAt, agreed } = cardLines([card({ days })]);
    expect(toLookAt).toEqual([]);
    expect(agreed).toMatchObject([{ isSignedByLead: true, isSignedByWorker: false, toAgree: [] }]);
  });

  test("an open question keeps a card to look at, and a change after signing is said", () => {
    const changed = { worker: null, lead: signature, hasLapsed: true };
    const days = [day("2026-05-11", { agreement: changed })];
    expect(cardLines([card({ days, openEnds: 1 })]).toLookAt).toMatchObject([
      { openEnds: 1, lapsed: ["2026-05-11"] },
    ]);
  });

  test("a closed card offers nothing more", () => {
    expect(cardLines([card({ isClosed: true })]).agreed).toMatchObject([{ toAgree: [] }]);
  });
});
