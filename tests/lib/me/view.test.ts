import { describe, expect, test } from "vitest";
import { cardDays, weeksOf } from "@/lib/agreement/card";
import { meDays, type OwnPart, type WeekFacts } from "@/lib/me/view";
import { zoneClock } from "@/lib/time/zone-clock";

const at = (text: string) => Date.parse(`2026-05-${text}:00Z`);
const nowMs = at("12T10:00");
const range = { from: "2026-05-11", to: "2026-05-14" };

function part(startMs: number, endMs: number | null, other: Partial<OwnPart> = {}): OwnPart {
  return {
    startMs,
    endMs,
    item: 0,
    activity: "run",
    ticket: "26048176",
    operation: "120",
    operationName: "Carve neck",
    code: null,
    seconds: endMs === null ? null : (endMs - startMs) / 1000,
    ...other,
  };
}
const rest = { activity: "rest", ticket: null, operation: null, operationName: null } as const;
const parts: OwnPart[] = [
  part(at("11T06:58"), at("11T10:00")),
  { ...part(at("11T10:00"), at("11T10:15")), ...rest },
  part(at("11T10:15"), at("11T15:30")),
  { ...part(at("12T06:57"), null), ticket: null, operation: null, code: "tool-care" },
];
const digestOf = () => "a".repeat(64);
const weeks = weeksOf({ versions: [], choices: [] }, "w", range, zoneClock("UTC"));
const facts: WeekFacts = {
  dates: ["2026-05-11", "2026-05-12", "2026-05-13"],
  card: cardDays({ parts, confirms: [] }, { weeks, range, digestOf, nowMs }),
  parts,
  planned: [
    { date: "2026-05-11", start: at("11T07:00") / 1000, end: at("11T15:30") / 1000 },
    { date: "2026-05-13", start: at("13T07:00") / 1000, end: at("13T15:30") / 1000 },
  ],
  paid: [],
  timeZone: "UTC",
  today: "2026-05-12",
  nowMs,
};

describe("meDays", () => {
  const [monday, tuesday, wednesday] = meDays(facts);

  test("a day that is over: planned, tapped, from when to when, and what was worked on", () => {
    expect(monday).toMatchObject({
      label: "Mon 11 May",
      plannedSeconds: 8.5 * 3600,
      tappedSeconds: 8 * 3600 + 32 * 60,
      span: "06:58 to 15:30",
      work: [
        {
          what: "Carve neck",
          ticket: "26-04817-6",
          seconds: 8 * 3600 + 17 * 60,
        },
      ],
      digest: "a".repeat(64),
      isSigned: false,
    });
  });

  test("today runs: since when, and nothing to agree to yet", () => {
    expect(tuesday).toMatchObject({
      isToday: true,
      runs: true,
      plannedSeconds: null,
      span: "since 06:57",
      digest: null,
      work: [{ what: "tool care", ticket: null, seconds: 3 * 3600 + 180 }],
    });
  });

  test("a day to come shows its plan, and no zero that was never tapped", () => {
    expect(wednesday).toMatchObject({ tappedSeconds: null, span: "07:00 to 15:30", work: [] });
  });
});
