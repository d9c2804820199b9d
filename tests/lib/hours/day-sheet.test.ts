import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type DayFacts, daySheets, type NamedSegment } from "@/lib/hours/day-sheet";
import type { Tap } from "@/lib/hours/tap-words";
import { sum } from "@/lib/sum";

const rules = [{ fromMs: 0, timeZone: "UTC", productionDayStartsAtMinutes: 0 }];
const at = (day: number, hour: number, minute = 0) => Date.UTC(2026, 4, day, hour, minute);

const segment = (startMs: number, endMs: number | null, fields: Partial<NamedSegment> = {}) => ({
  startMs,
  endMs,
  item: 0,
  activity: "run" as const,
  ticket: "26048176",
  operation: "110",
  operationName: "Carve neck",
  code: null,
  weight: 1,
  seconds: endMs === null ? null : (endMs - startMs) / 1000,
  cell: "Neck",
  said: false,
  eventId: `at ${startMs}`,
  ...fields,
});

const tap = (id: string, atMs: number, kind: string, body: Tap["body"] = {}): Tap => ({
  id,
  kind,
  atMs,
  receivedMs: atMs + 900,
  kiosk: "Neck 1",
  by: null,
  keptFor: null,
  body,
  note: null,
});

const sheets = (dates: string[], facts: Partial<DayFacts>) =>
  daySheets(dates, {
    segments: [],
    taps: [],
    planned: new Map(),
    rules,
    now: at(20, 0) / 1000,
    ...facts,
  });

describe("daySheets", () => {
  test("a stretch over midnight stands in both days, each with its own part", () => {
    const [first, second] = sheets(["2026-05-14", "2026-05-15"], {
      segments: [segment(at(14, 23), at(15, 2))],
    });
    expect(first!.sums.attendedSeconds).toBe(3600);
    expect(second!.sums.attendedSeconds).toBe(7200);
    expect(second!.lines).toMatchObject([{ at: at(15, 0) / 1000, until: at(15, 2) / 1000 }]);
  });

  test("the record behind a stretch is named, and one that began none stands between", () => {
    const began = tap(`at ${at(14, 8)}`, at(14, 8), "work");
    const counted = tap("r", at(14, 8, 30), "report", { good: 1, stop: false });
    const [day] = sheets(["2026-05-14"], {
      segments: [segment(at(14, 8), at(14, 9)), segment(at(14, 9), at(14, 10))],
      taps: [counted, began],
    });
    expect(day!.lines.map(({ what, tap: behind }) => [what, behind?.id ?? null])).toEqual([
      ["Work", began.id],
      ["Counted 1 good", "r"],
      ["Work", null],
    ]);
  });

  test("what was taken back is shown as such", () => {
    const wrong = tap("w", at(14, 8), "indirect", { code: "cleaning" });
    const undo = tap("u", at(14, 8), "undo", { event: "w" });
    const [day] = sheets(["2026-05-14"], { taps: [wrong, undo] });
    expect(day!.lines.map(({ what, isVoid }) => [what, isVoid])).toEqual([
      ["Other work, cleaning", true],
      ["Took a record back", false],
    ]);
  });

  test("several tickets at once are one line with their shares", () => {
    const both = { startMs: at(14, 8), endMs: at(14, 9), eventId: "e" };
    const [day] = sheets(["2026-05-14"], {
      segments: [
        segment(both.startMs, both.endMs, { eventId: "e", weight: 2 }),
        segment(both.startMs, both.endMs, { eventId: "e", item: 1, ticket: "2", weight: 1 }),
      ],
    });
    expect(day!.sums.directSeconds).toBe(3600);
    expect(day!.lines).toHaveLength(1);
    expect(day!.lines[0]!.shares.map(({ seconds }) => seconds)).toEqual([2400, 1200]);
  });

  test("a stretch that runs is cut at now", () => {
    const [day] = sheets(["2026-05-14"], {
      segments: [segment(at(14, 8), null)],
      now: at(14, 9) / 1000,
    });
    expect(day!.sums.attendedSeconds).toBe(3600);
    expect(day!.lines[0]).toMatchObject({ runs: true, until: at(14, 9) / 1000 });
  });

  test("for any segments, a day's figures are the sum of the lines under it", () => {
    const pieces = fc.array(fc.tuple(fc.integer({ min: 1, max: 300 }), fc.nat(60)), {
      minLength: 1,
      maxLength: 30,
    });
    fc.assert(
      fc.property(pieces, (timeline) => {
        let ms = at(14, 6);
        const made = timeline.map(([minutes, gap]) => {
          const start = ms + gap * 60_000;
          ms = start + minutes * 60_000;
          return segment(start, ms);
        });
        for (const day of sheets(["2026-05-14", "2026-05-15"], { segments: made })) {
          const lines = day.lines.map(({ at: from, until }) => (until ?? from) - from);
          expect(sum(lines)).toBe(day.sums.attendedSeconds);
          expect(sum(day.strip.map(({ start, end }) => end - start))).toBe(sum(lines));
          expect(sum(day.lines.flatMap(({ shares }) => shares.map((s) => s.seconds)))).toBe(
            sum(lines),
          );
        }
      }),
    );
  });
});
