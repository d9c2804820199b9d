import { describe, expect, test } from "vitest";
import { cardDays, paySpans, weeksOf, windowOf } from "@/lib/agreement/card";
import type { DayPart } from "@/lib/agreement/day-text";
import { agreementSubject } from "@/lib/agreement/signatures";
import { zoneClock } from "@/lib/time/zone-clock";

const HOUR = 3_600_000;
const at = (text: string) => Date.parse(`2026-05-${text}:00Z`);
const nowMs = at("13T12:00");
const range = { from: "2026-05-11", to: "2026-05-18" };
const weeks = weeksOf({ versions: [], choices: [] }, "w", range, zoneClock("UTC"));
const digestOf = (text: string) => String(text.length).padStart(64, "0");
const rules = { weeks, range, digestOf, nowMs };

function part(startMs: number, endMs: number | null, other: Partial<DayPart> = {}): DayPart {
  const seconds = endMs === null ? null : (endMs - startMs) / 1000;
  const base = { item: 0, activity: "run", ticket: null, operation: null, code: null } as const;
  return { startMs, endMs, seconds, ...base, ...other };
}

const parts = [
  part(at("11T06:00"), at("11T10:00")),
  part(at("11T10:00"), at("11T10:30"), { activity: "meal" }),
  part(at("11T10:30"), at("11T14:30")),
  part(at("12T22:00"), at("13T02:00")),
  part(at("13T10:00"), null),
];

describe("cardDays", () => {
  const [monday, tuesday, wednesday] = cardDays({ parts, confirms: [] }, rules);

  test("has a day for each workday with time, present from coming in to leaving", () => {
    expect(monday).toMatchObject({ date: "2026-05-11", presentSeconds: 8.5 * 3600, runs: false });
    expect(tuesday).toMatchObject({ date: "2026-05-12", presentSeconds: 2 * 3600 });
    expect(cardDays({ parts: [], confirms: [] }, rules)).toEqual([]);
  });

  test("a day that still runs counts until now, and is not agreed to yet", () => {
    expect(wednesday).toMatchObject({ runs: true, digest: null, agreement: null });
    expect(wednesday?.presentSeconds).toBe(2 * 3600 + 2 * 3600);
  });

  test("knows who agreed to the day as it is", () => {
    const confirm = {
      atMs: at("12T08:00"),
      by: "Ada Berg",
      subject: agreementSubject("2026-05-11", monday!.digest!),
    };
    const [agreed] = cardDays({ parts, confirms: [confirm] }, rules);
    expect(agreed?.agreement?.lead).toEqual({ atMs: confirm.atMs, by: "Ada Berg" });
  });

  test("shared time counts once", () => {
    const shared = [...parts, part(at("11T06:00"), at("11T10:00"), { item: 1 })];
    expect(cardDays({ parts: shared, confirms: [] }, rules)[0]?.presentSeconds).toBe(8.5 * 3600);
  });
});

describe("weeksOf", () => {
  test("a site without a policy counts calendar days from Monday", () => {
    expect(weeks.map(({ week }) => week.date)).toEqual(["2026-05-11"]);
    expect(weeks[0]?.version.name).toBe("straight");
  });
});

describe("paySpans", () => {
  test("all but rests and meals is work; what runs lasts until now", () => {
    expect(paySpans(parts.slice(1), nowMs)).toEqual([
      { start: at("11T10:00") / 1000, end: at("11T10:30") / 1000, kind: "meal", rate: null },
      { start: at("11T10:30") / 1000, end: at("11T14:30") / 1000, kind: "work", rate: null },
      { start: at("12T22:00") / 1000, end: at("13T02:00") / 1000, kind: "work", rate: null },
      { start: at("13T10:00") / 1000, end: nowMs / 1000, kind: "work", rate: null },
    ]);
    const twice = [parts[0]!, { ...parts[0]!, item: 1 }];
    expect(paySpans(twice, nowMs)).toHaveLength(1);
    expect(paySpans([part(nowMs + HOUR, null)], nowMs)).toEqual([]);
  });
});

describe("windowOf", () => {
  test("holds workdays that begin at any hour of their date", () => {
    expect(windowOf(range, zoneClock("UTC"))).toEqual({
      fromMs: at("10T00:00"),
      toMs: at("19T00:00"),
    });
  });
});
