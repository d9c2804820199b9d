import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { sum } from "@/lib/sum";
import { sumWindow } from "@/lib/timeline/day-sums";
import { fold } from "@/lib/timeline/fold";
import type { Folded, FoldFacts, LedgerEvent, LooseEnd } from "@/lib/timeline/schema";
import { endKey } from "@/lib/timeline/settlements";
import { eventStream } from "@/tests/make/event-streams";
import { foldFacts, makeEvent } from "@/tests/make/events";
import { plays } from "@/tests/say/plays";

const START_MS = Date.parse("2026-06-08T06:00:00Z");
const HOUR_MS = 3_600_000;
const planned = [0, 1, 2, 3, 4].map((day) => ({
  start: START_MS / 1000 + day * 86_400,
  end: START_MS / 1000 + day * 86_400 + 30_600,
}));
const facts: FoldFacts = { ...foldFacts, planned };
const stream = eventStream({ startMs: START_MS, gapSeconds: 8 * 3600, firstNumber: 1 });
/** Late enough that nothing depends on it any more. */
const LATE_MS = START_MS + 60 * 86_400_000;
const asOf = fc.constantFrom(LATE_MS, START_MS, START_MS + 30 * HOUR_MS);

describe("fold", () => {
  plays({
    "a whole day at the bench": `
      07:58:12 ana shift-start
      08:01:40 ana setup A
      08:20 ana run A*5400 B*1800
      09:15 ana count A 1
      10:00 ana rest
      10:12 ana break-end
      11:30 ana done A 1
      12:00 ana meal
      12:31 ana break-end
      13:05 ana other waiting-material
      13:40 ana run B since 13:20
      15:00 ana done B 2 0 1
      15:20 ana other cleaning
      15:31:07 ana shift-end
      = ana 07:58:12 08:01:40 unassigned
      = ana 08:01:40 08:20 setup A
      = ana 08:20 10:00 run A*5400 B*1800
      = ana 10:00 10:12 rest
      = ana 10:12 11:30 run A*5400 B*1800
      = ana 11:30 12:00 run B*1800
      = ana 12:00 12:31 meal
      = ana 12:31 13:05 run B*1800
      = ana 13:05 13:20 other waiting-material
      = ana 13:20 15:00 run B (said)
      = ana 15:00 15:20 unassigned
      = ana 15:20 15:31:07 other cleaning
      + ana 09:15 A 1 0 0
      + ana 11:30 A 1 0 0
      + ana 15:00 B 2 0 1`,
    "two people on one ticket are two timelines": `
      08:00 ana shift-start
      08:00 ben shift-start
      08:00 ana run A
      08:30 ben run A
      09:00 ana done A 1
      10:00 ana shift-end
      10:00 ben shift-end
      = ana 08:00 09:00 run A
      = ana 09:00 10:00 unassigned
      = ben 08:00 08:30 unassigned
      = ben 08:30 10:00 run A
      + ana 09:00 A 1 0 0`,
  });

  test("no events are no time", () => {
    expect(fold([], facts, LATE_MS)).toEqual({
      segments: [],
      shifts: [],
      looseEnds: [],
      reports: [],
      standing: null,
    });
  });
});

describe("fold: where the worker stands", () => {
  const minute = (number: number) => START_MS + number * 60_000;
  const item = { ticket: "26048176", operation: "120" };
  const acts: LedgerEvent[] = [
    makeEvent(1, minute(0), { kind: "shift-start" }),
    makeEvent(2, minute(10), {
      kind: "work",
      activity: "run",
      items: [item],
      since: new Date(minute(5)).toISOString(),
    }),
    makeEvent(3, minute(60), { kind: "break-start", break: "rest" }),
    makeEvent(4, minute(70), { kind: "break-end", break: "rest" }),
    makeEvent(5, minute(90), { kind: "report", ...item, good: 1, rework: 0, scrap: 0, stop: true }),
    makeEvent(6, minute(99), { kind: "shift-end" }),
  ];
  const standing = (count: number) => fold(acts.slice(0, count), facts, START_MS).standing;
  const second = (number: number) => minute(number) / 1000;

  test("after the start nothing is booked", () => {
    expect(standing(1)).toMatchObject({
      doing: { kind: "unassigned" },
      since: second(0),
      break: null,
    });
    expect(standing(1)?.shift).toMatchObject({ start: second(0), end: null });
  });
  test("on work: since when, whether it was said, and from which act", () => {
    expect(standing(2)).toMatchObject({
      doing: { kind: "work", activity: "run" },
      since: second(5),
      said: true,
      event: acts[1]?.id,
    });
  });
  test("in a break: what it interrupted, and since when it lasts", () => {
    expect(standing(3)).toMatchObject({
      doing: { kind: "work" },
      since: second(5),
      event: acts[1]?.id,
      break: { kind: "rest", since: second(60), event: acts[2]?.id },
    });
  });
  test("after a break the stretch is new, the act the same", () => {
    expect(standing(4)).toMatchObject({ since: second(70), said: false, event: acts[1]?.id });
  });
  test("when all is done, nothing", () => {
    expect(standing(5)).toMatchObject({ doing: { kind: "unassigned" }, since: second(90) });
  });
  test("after the end, nowhere", () => {
    expect(standing(6)).toBeNull();
  });
});

describe("fold: laws", () => {
  test("for any events, segments partition each shift to the second", () => {
    fc.assert(
      fc.property(stream, asOf, (events, asOfMs) => {
        const { segments, shifts } = fold(events, facts, asOfMs);
        let rest = [...segments];
        for (const shift of shifts) {
          const inside = rest.filter((one) => shift.end === null || one.start < shift.end);
          rest = rest.slice(inside.length);
          expect(inside[0]?.start).toBe(shift.start);
          inside.forEach((segment, index) => {
            expect(segment.end).toBe(inside[index + 1]?.start ?? shift.end);
            if (segment.end !== null) expect(segment.end).toBeGreaterThan(segment.start);
          });
        }
        expect(rest).toEqual([]);
      }),
    );
  });

  test("for any events, shifts follow each other, none is longer than 36 hours, one is open", () => {
    fc.assert(
      fc.property(stream, asOf, (events, asOfMs) => {
        const { shifts, standing } = fold(events, facts, asOfMs);
        shifts.forEach(({ start, end }, index) => {
          const next = shifts[index + 1];
          if (end === null) expect(next).toBeUndefined();
          else expect(end - start).toBeLessThanOrEqual(36 * 3600);
          if (next) expect(next.start).toBeGreaterThanOrEqual(end!);
        });
        expect(standing?.shift ?? null).toEqual(shifts.find(({ end }) => end === null) ?? null);
      }),
    );
  });

  test("for any events, direct, indirect, rest and unassigned are attendance, with meals the span", () => {
    fc.assert(
      fc.property(stream, (events) => {
        const { segments, shifts } = fold(events, facts, LATE_MS);
        const sums = sumWindow(segments, { start: 0, end: LATE_MS / 1000 }, LATE_MS / 1000);
        const { directSeconds, indirectSeconds, restSeconds, unassignedSeconds } = sums;
        const parts = [directSeconds, indirectSeconds, restSeconds, unassignedSeconds];
        expect(sum(parts)).toBe(sums.attendanceSeconds);
        const span = sum(shifts.map(({ start, end }) => (end ?? Number.NaN) - start));
        expect(sums.attendanceSeconds + sums.mealSeconds).toBe(span);
      }),
    );
  });

  test("for any events, arrival order and duplicates change nothing", () => {
    const shuffled = stream.chain((events) =>
      fc.tuple(
        fc.constant(events),
        fc.shuffledSubarray([...events, ...events], {
          minLength: events.length * 2,
          maxLength: events.length * 2,
        }),
      ),
    );
    fc.assert(
      fc.property(shuffled, asOf, ([events, again], asOfMs) => {
        expect(fold(again, facts, asOfMs)).toEqual(fold(events, facts, asOfMs));
      }),
    );
  });

  test("for any act, undone at once, it never was", () => {
    const body = fc.constantFrom<LedgerEvent["body"]>(
      { kind: "shift-start" },
      { kind: "shift-end" },
      { kind: "break-start", break: "meal" },
      { kind: "work", activity: "run", items: [{ ticket: "90001", operation: "120" }] },
      { kind: "indirect", code: "meeting" },
      { kind: "object", subject: "count" },
    );
    fc.assert(
      fc.property(stream, body, fc.nat(40 * 3600), fc.nat(10_000), (events, act, second, later) => {
        const atMs = START_MS + second * 1000;
        const slip = makeEvent(900, atMs, act);
        const undo = makeEvent(901, atMs + later, { kind: "undo", event: slip.id });
        expect(fold([...events, slip, undo], facts, LATE_MS)).toEqual(fold(events, facts, LATE_MS));
      }),
    );
  });

  test("for any events, each loose end is there once, in order of time", () => {
    fc.assert(
      fc.property(stream, asOf, (events, asOfMs) => {
        const { looseEnds } = fold(events, facts, asOfMs);
        const keys = looseEnds.map(({ code, subject }) => endKey(code, subject));
        expect(new Set(keys).size).toBe(keys.length);
        const times = looseEnds.map(({ at }) => at);
        expect(times).toEqual([...times].sort((a, b) => a - b));
      }),
    );
  });

  test("for any events, what happens later than now leaves the past alone", () => {
    fc.assert(
      fc.property(stream, asOf, (events, asOfMs) => {
        const { reports } = fold(events, facts, asOfMs);
        expect(fold(events, facts, LATE_MS).reports).toEqual(reports);
      }),
    );
  });
});

describe("fold: windows", () => {
  /** Two clusters of events with a gap longer than limit and rest between them. */
  const clusters = eventStream({ startMs: START_MS, gapSeconds: 3600, firstNumber: 1 }, 12).chain(
    (early) => {
      const startMs = lastMs(early) + 14 * HOUR_MS + 1001;
      const late = eventStream({ startMs, gapSeconds: 3600, firstNumber: 101 }, 12);
      return fc.tuple(fc.constant(early), late);
    },
  );
  const withCorrections = clusters.chain(([early, late]) => {
    const target = fc.constantFrom(...early.map(({ id }) => id));
    const made = fc.array(
      fc.tuple(fc.constantFrom("void", "accept", "reassign", "undo"), target, fc.nat(HOUR_MS)),
      { maxLength: 3 },
    );
    return fc.tuple(
      fc.constant(early),
      fc.constant(late),
      made.map((list) =>
        list.map(([how, id, ms], index) => correction(how, id, lastMs(late) + ms, index)),
      ),
    );
  });

  test("for any gap longer than limit and rest, the parts make the whole", () => {
    fc.assert(
      fc.property(withCorrections, ([early, late, corrections]) => {
        const whole = fold([...early, ...late, ...corrections], facts, LATE_MS);
        const parts = [
          fold([...early, ...corrections], facts, LATE_MS),
          fold([...late, ...corrections], facts, LATE_MS),
        ];
        expect(parts.flatMap(({ segments }) => segments)).toEqual(whole.segments);
        expect(parts.flatMap(({ shifts }) => shifts)).toEqual(whole.shifts);
        expect(parts.flatMap(({ reports }) => reports)).toEqual(whole.reports);
        expect(keysOf(parts, early, late)).toEqual(keysOf([whole], early, late));
      }),
    );
  });

  function lastMs(events: readonly LedgerEvent[]): number {
    return Math.max(...events.map(({ atMs }) => atMs));
  }
  function correction(how: string, event: string, atMs: number, index: number): LedgerEvent {
    const bodies: Record<string, LedgerEvent["body"]> = {
      void: { kind: "void", event },
      undo: { kind: "undo", event },
      reassign: { kind: "reassign", event, code: "training" },
      accept: { kind: "settle", end: `no-shift-end:${event}`, answer: "accept" },
    };
    return makeEvent(201 + index, atMs, bodies[how]!);
  }
  /** Loose ends on events of the two clusters; those on the corrections lie in both parts. */
  function keysOf(folds: Folded[], ...clusters: LedgerEvent[][]): string[] {
    const ids = new Set(clusters.flat().map(({ id }) => id));
    const text = ({ code, subject, at, settled }: LooseEnd) =>
      `${endKey(code, subject)} ${at} ${settled}`;
    return folds
      .flatMap(({ looseEnds }) => looseEnds.filter(({ subject }) => ids.has(subject)).map(text))
      .sort();
  }
});
