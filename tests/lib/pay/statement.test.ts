import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { PayAnswer } from "@/lib/pay/answer";
import { payRequest } from "@/lib/pay/request";
import { payStatement } from "@/lib/pay/statement";
import { daily, HOUR, payCheck, stated } from "@/tests/make/pay";

/** Hours by bucket. */
function hours({ totals }: PayAnswer) {
  const { regular, overtime, double } = totals.buckets;
  return { regular: regular / HOUR, overtime: overtime / HOUR, double: double / HOUR };
}

describe("payStatement: California (checks)", () => {
  test.each(["ca-5x10", "ca-6x9", "ca-13h-day", "ca-six10-one14-last"])("%s", (id) => {
    const check = payCheck<
      { workweek_days: number[] },
      { regular_hours: number; overtime_hours: number; double_hours: number }
    >(id);
    expect(hours(stated({ spans: daily("2026-06-07", check.given.workweek_days) }))).toEqual({
      regular: check.expect.regular_hours,
      overtime: check.expect.overtime_hours,
      double: check.expect.double_hours,
    });
  });
  test("seven days in a row across two workweeks are no seventh day, but worth a look", () => {
    const check = payCheck<{ days: Record<string, number> }, { regular_hours: number }>(
      "ca-seventh-day-across-weeks",
    );
    const spans = daily("2026-06-10", Object.values(check.given.days));
    const answer = stated({ spans });
    expect(hours(answer)).toEqual({ regular: check.expect.regular_hours, overtime: 0, double: 0 });
    const inRow = answer.warnings.filter(({ code }) => code === "consecutive-days");
    expect(inRow.map(({ date }) => date)).toEqual(["2026-06-16"]);
  });
  test("a shift over midnight is two workdays", () => {
    const check = payCheck<{ punches: [string, string][] }, { workday_hours: object }>(
      "ca-overnight-one-shift",
    );
    const answer = stated({ spans: check.given.punches });
    const byDay = answer.workweeks[0]!.days.map((day) => [day.date, day.paidSeconds / HOUR]);
    expect(Object.fromEntries(byDay)).toEqual(check.expect.workday_hours);
    expect(hours(answer)).toEqual({ regular: 16, overtime: 0, double: 0 });
  });
  test("but one workday where the policy gives shifts to the day on which they start", () => {
    const overtime = {
      daily: [
        { overHours: 8, bucket: "overtime" as const },
        { overHours: 12, bucket: "double" as const },
      ],
    };
    const policy = { attribution: "shift-start" as const, overtime };
    const answer = stated({ policy, spans: [["2026-06-09T16:00", "2026-06-10T08:00"]] });
    expect(hours(answer)).toEqual({ regular: 8, overtime: 4, double: 4 });
    expect(answer.workweeks[0]!.days.map(({ date }) => date)).toEqual(["2026-06-09"]);
  });
});

describe("payStatement: federal (checks)", () => {
  test("each workweek stands alone (29 CFR 778.104)", () => {
    const { given, expect: expected } = payCheck<
      { biweekly_pay_period: number[] },
      { overtime_hours_by_week: number[] }
    >("flsa-104");
    const weeks = given.biweekly_pay_period.map((total) => [0, ...Array(5).fill(total / 5), 0]);
    const answer = stated({ policy: "us-federal", spans: daily("2026-06-07", weeks.flat()) });
    expect(answer.workweeks.map((week) => week.totals.buckets.overtime / HOUR)).toEqual(
      expected.overtime_hours_by_week,
    );
  });
  test("rounding by quarters: 06:50 to 15:37 with a meal, five days (Fact Sheet 53, example 2)", () => {
    const { expect: expected } = payCheck<unknown, Record<string, number>>("round-fs53-ex2");
    const days = ["08", "09", "10", "11", "12"];
    const spans = days.flatMap((day) => [
      [`2026-06-${day}T06:50`, `2026-06-${day}T11:00`] as const,
      [`2026-06-${day}T11:00`, `2026-06-${day}T11:30`, "meal"] as const,
      [`2026-06-${day}T11:30`, `2026-06-${day}T15:37`] as const,
    ]);
    const policy = {
      workweek: { startsOn: "sunday" as const },
      rounding: { mode: "nearest" as const, minutes: 15 as const },
      overtime: { weekly: [{ overHours: 40, bucket: "overtime" as const }] },
    };
    const rounded = stated({ policy, spans });
    expect(rounded.totals.paidSeconds / HOUR).toBe(expected.week_hours);
    expect(rounded.totals.buckets.overtime / HOUR).toBe(expected.overtime_hours);
    expect(stated({ policy: "straight", spans }).totals.paidSeconds / HOUR).toBeCloseTo(
      expected.unrounded_week_hours!,
      6,
    );
    const worked = rounded.workweeks[0]!.days.map(({ workedSeconds }) => workedSeconds);
    expect(worked).toEqual(days.map(() => 8 * HOUR + 17 * 60));
    expect(rounded.warnings.map(({ code }) => code)).toEqual(["rounding-bias"]);
  });
  test("the neutrality report sums paid less worked (29 CFR 785.48(b))", () => {
    const { given, expect: expected } = payCheck<
      { shifts: [string, string][] },
      { actual_minutes: number; rounded_minutes: number }
    >("round-neutrality");
    const spans = given.shifts.map(
      ([start, end], index) =>
        [`2026-06-0${index + 1}T${start}`, `2026-06-0${index + 1}T${end}`] as const,
    );
    const policy = { rounding: { mode: "nearest" as const, minutes: 15 as const } };
    const answer = stated({ policy, spans });
    const worked = answer.workweeks.flatMap(({ days }) => days.map((day) => day.workedSeconds));
    expect(worked.reduce((a, b) => a + b) / 60).toBe(expected.actual_minutes);
    expect(answer.totals.paidSeconds / 60).toBe(expected.rounded_minutes);
    const bias = answer.warnings.find(({ code }) => code === "rounding-bias");
    expect(bias?.text).toContain("Rounding took 4 min from the worker");
  });
});

describe("payStatement: clocks that change", () => {
  const night = { policy: "straight" as const, from: "2026-01-01", to: "2027-01-01" };
  test.each([
    ["America/New_York", "2026-03-07T22:00", "2026-03-08T06:00", 7],
    ["America/New_York", "2026-10-31T22:00", "2026-11-01T06:00", 9],
    ["Australia/Lord_Howe", "2026-10-03T22:00", "2026-10-04T06:00", 7.5],
    ["America/Vancouver", "2026-10-31T22:00", "2026-11-01T06:00", 8],
  ])("%s, %s to %s is %d hours (time.json)", (zone, start, end, length) => {
    expect(stated({ ...night, zone, spans: [[start, end]] }).totals.paidSeconds).toBe(
      length * HOUR,
    );
  });
  test("a workweek tells its bounds with the offset that each has", () => {
    const spans = [["2026-03-09T08:00", "2026-03-09T12:00"]] as const;
    const answer = stated({ policy: "us-federal", from: "2026-03-08", to: "2026-03-15", spans });
    expect(answer.workweeks[0]).toMatchObject({
      start: "2026-03-08T00:00:00-08:00",
      end: "2026-03-15T00:00:00-07:00",
    });
  });
  test("a workweek from Monday 06:00 cuts a night shift (time.json)", () => {
    const policy = { workweek: { startsOn: "monday" as const, at: "06:00" } };
    const spans = [["2026-06-14T22:00", "2026-06-15T08:00"]] as const;
    const answer = stated({ policy, spans });
    expect(answer.workweeks.map(({ totals }) => totals.paidSeconds / HOUR)).toEqual([8, 2]);
    expect(answer.workweeks.flatMap(({ days }) => days.map(({ date }) => date))).toEqual([
      "2026-06-14",
      "2026-06-15",
    ]);
  });
  test("a shift given to its first day still ends with the workweek", () => {
    const policy = { attribution: "shift-start" as const };
    const answer = stated({ policy, spans: [["2026-06-14T22:00", "2026-06-15T08:00"]] });
    const days = answer.workweeks.flatMap((week) => week.days);
    expect(days.map(({ date, paidSeconds }) => [date, paidSeconds / HOUR])).toEqual([
      ["2026-06-14", 2],
      ["2026-06-15", 8],
    ]);
  });
});

describe("payStatement: the range", () => {
  test("a workweek that the range cuts is worked out whole and shown with its days inside", () => {
    const spans = daily("2026-06-07", [0, 10, 10, 10, 10, 10, 0]);
    const answer = stated({ policy: "us-federal", from: "2026-06-12", to: "2026-06-20", spans });
    expect(answer.workweeks).toHaveLength(1);
    expect(answer.workweeks[0]!.days.map(({ date }) => date)).toEqual(["2026-06-12"]);
    expect(hours(answer)).toEqual({ regular: 0, overtime: 10, double: 0 });
    expect(answer.workweeks[0]!.totals).toEqual(answer.totals);
  });
  test("`to` is exclusive, and time outside is not shown", () => {
    const spans = daily("2026-06-07", [8, 8, 8]);
    const answer = stated({ from: "2026-06-07", to: "2026-06-08", spans });
    expect(answer.totals.paidSeconds).toBe(8 * HOUR);
    expect(stated({ from: "2026-07-01", to: "2026-07-08", spans }).workweeks).toEqual([]);
  });
  test("without spans there is nothing, and every premium is named", () => {
    const policy = { premiums: [{ code: "night", from: "22:00", to: "06:00" }] };
    expect(stated({ policy, spans: [] })).toEqual({
      workweeks: [],
      totals: {
        paidSeconds: 0,
        buckets: { regular: 0, overtime: 0, double: 0 },
        premiums: { night: 0 },
      },
      warnings: [],
    });
  });
});

describe("payStatement: breaks and their trail", () => {
  test("a rest of 15 minutes is paid, a meal of 30 is not (29 CFR 785.18, 785.19)", () => {
    const { expect: expected } = payCheck<unknown, { paid_hours: number }>("break-785-18-19");
    const answer = stated({
      policy: "us-federal",
      spans: [
        ["2026-06-09T07:00", "2026-06-09T10:00"],
        ["2026-06-09T10:00", "2026-06-09T10:15", "rest"],
        ["2026-06-09T10:15", "2026-06-09T12:00"],
        ["2026-06-09T12:00", "2026-06-09T12:30", "meal"],
        ["2026-06-09T12:30", "2026-06-09T15:30"],
      ],
    });
    expect(answer.totals.paidSeconds / HOUR).toBe(expected.paid_hours);
    expect(answer.workweeks[0]!.days[0]!.trail).toEqual([
      { rule: "rest-paid", seconds: 900, text: "A rest of 15 min is paid; the limit is 20 min." },
      { rule: "meal-unpaid", seconds: 1800, text: "A meal of 30 min is unpaid." },
      {
        rule: "regular",
        seconds: 8 * HOUR,
        text: "8 h 00 min within every limit: regular.",
      },
    ]);
    expect(answer.warnings).toEqual([]);
  });
  test("a gap is time off duty; one as short as a rest is asked about", () => {
    const spans = [
      ["2026-06-09T07:00", "2026-06-09T10:00"],
      ["2026-06-09T10:15", "2026-06-09T12:00"],
    ] as const;
    const answer = stated({ policy: "us-federal", spans });
    expect(answer.totals.paidSeconds).toBe(4.75 * HOUR);
    expect(answer.workweeks[0]!.days[0]!.trail[0]).toMatchObject({
      rule: "off-duty",
      seconds: 900,
    });
    expect(answer.warnings.map(({ code }) => code)).toEqual(["gap-short"]);
  });
  test("the trail tells each bucket by the tier that lifted it", () => {
    const trail = stated({ spans: daily("2026-06-08", [13]) }).workweeks[0]!.days[0]!.trail;
    expect(trail.map(({ rule, seconds, text }) => [rule, seconds / HOUR, text])).toEqual([
      ["regular", 8, "8 h 00 min within every limit: regular."],
      ["daily", 4, "4 h 00 min over 8 h of the workday: overtime."],
      ["daily", 1, "1 h 00 min over 12 h of the workday: double."],
    ]);
  });
});

describe("payStatement: premiums", () => {
  const night = { code: "night", from: "22:00", to: "06:00" };
  const premiumsOf = (policy: object, start: string, end: string) =>
    stated({ policy, spans: [[start, end]] }).totals.premiums;

  test("a window belongs to the day on which it opens, cut to the second", () => {
    const policy = { premiums: [{ ...night, days: ["monday" as const] }] };
    // 8 June 2026 is a Monday
    expect(premiumsOf(policy, "2026-06-08T21:59:59", "2026-06-09T06:00:01")).toEqual({
      night: 8 * HOUR,
    });
    expect(premiumsOf(policy, "2026-06-08T00:00", "2026-06-08T06:00")).toEqual({ night: 0 });
    expect(premiumsOf(policy, "2026-06-09T22:00", "2026-06-09T23:00")).toEqual({ night: 0 });
  });
  test("without days it opens every day; a whole date holds from midnight to midnight", () => {
    const holiday = { code: "holiday", dates: ["2026-06-10"] };
    expect(
      premiumsOf({ premiums: [night, holiday] }, "2026-06-09T20:00", "2026-06-10T07:00"),
    ).toEqual({ night: 8 * HOUR, holiday: 7 * HOUR });
  });
  test("entries of one code are one premium: what they share is counted once", () => {
    const weekend = { code: "off", days: ["saturday" as const] };
    const policy = { premiums: [weekend, { code: "off", dates: ["2026-06-13"] }] };
    expect(premiumsOf(policy, "2026-06-13T08:00", "2026-06-13T12:00")).toEqual({ off: 4 * HOUR });
  });
  test("they are beside the buckets and on the trail", () => {
    const policy = {
      premiums: [night],
      overtime: { daily: [{ overHours: 4, bucket: "overtime" as const }] },
    };
    const { days } = stated({ policy, spans: [["2026-06-09T18:00", "2026-06-10T00:00"]] })
      .workweeks[0]!;
    expect(days[0]).toMatchObject({
      buckets: { regular: 4 * HOUR, overtime: 2 * HOUR },
      premiums: { night: 2 * HOUR },
    });
    expect(days[0]!.trail.at(-1)).toMatchObject({ rule: "premium", seconds: 2 * HOUR });
  });
});

describe("payStatement: money", () => {
  const extras = [{ workweek: "2026-06-07", amount: "46.00" }];
  test("46 hours at 12.00 with a bonus of 46.00 (29 CFR 778.110(b))", () => {
    const { expect: expected } = payCheck<unknown, { pay: number }>("flsa-110b");
    const spans = daily("2026-06-08", [9, 9, 9, 9, 10], "12.00");
    const [week] = stated({ policy: "us-federal", spans, extras }).workweeks;
    expect(week?.pay).toEqual({
      straightTime: "552.00",
      extras: "46.00",
      regularRate: "13.000000",
      overtimePremium: "39.00",
      total: "637.00",
    });
    expect(Number(week?.pay?.total)).toBe(expected.pay);
  });
  test("without rates or extras there is no pay", () => {
    const answer = stated({ policy: "us-federal", spans: daily("2026-06-08", [8]) });
    expect(answer.workweeks[0]).not.toHaveProperty("pay");
  });
  test("a paid rest takes the rate of the work before it, a short meal too", () => {
    const spans = [
      ["2026-06-08T08:00", "2026-06-08T09:00", "work", "10"],
      ["2026-06-08T09:00", "2026-06-08T09:15", "rest"],
      ["2026-06-08T09:15", "2026-06-08T10:00", "work", "20"],
      ["2026-06-08T10:00", "2026-06-08T10:15", "meal"],
    ] as const;
    const [week] = stated({ policy: "us-federal", spans }).workweeks;
    expect(week?.pay?.straightTime).toBe("32.50");
  });
  test("rounded time is paid at the rate beside it", () => {
    const policy = { rounding: { mode: "nearest" as const, minutes: 15 as const } };
    const spans = [
      ["2026-06-08T07:55", "2026-06-08T09:00", "work", "12"],
      ["2026-06-08T09:00", "2026-06-08T10:10", "work", "24"],
    ] as const;
    const [week] = stated({ policy, spans }).workweeks;
    expect(week?.pay?.straightTime).toBe("42.00");
  });
  test("a workweek with an extra and no hours is shown, with no rate", () => {
    const answer = stated({ policy: "us-federal", spans: [], extras });
    expect(answer.workweeks).toMatchObject([
      { days: [], pay: { regularRate: null, total: "46.00" } },
    ]);
  });
  test("an extra is paid in the range that has the workweek's last day, and rates both", () => {
    const spans = daily("2026-06-08", [9, 9, 9, 9, 10], "12.00");
    const part = (from: string, to: string) =>
      stated({ policy: "us-federal", spans, extras, from, to }).workweeks[0]?.pay;
    const [first, last] = [part("2026-06-07", "2026-06-12"), part("2026-06-12", "2026-06-14")];
    expect([first?.regularRate, last?.regularRate]).toEqual(["13.000000", "13.000000"]);
    expect([first?.extras, last?.extras]).toEqual(["0.00", "46.00"]);
    expect([first?.overtimePremium, last?.overtimePremium]).toEqual(["0.00", "39.00"]);
    expect([first?.total, last?.total]).toEqual(["432.00", "205.00"]);
  });
  test("a flat sum in California (Alvarado v. Dart, 2018)", () => {
    const flat = [{ workweek: "2026-06-07", amount: "30", kind: "flat-sum" as const }];
    const spans = daily("2026-06-07", [8, 8, 8, 8, 8, 8, 0], "12");
    const { expect: expected } = payCheck<unknown, Record<string, number>>("ca-flat-bonus");
    const total = (policy: "us-california" | "us-federal") =>
      Number(stated({ policy, spans, extras: flat }).workweeks[0]?.pay?.total);
    expect(total("us-california")).toBe(expected.california_pay);
    expect(total("us-federal")).toBe(expected.flsa_pay);
  });
});

describe("payStatement: laws", () => {
  const MINUTES = fc.integer({ min: 1, max: 700 });
  const kinds = fc.constantFrom("work", "work", "rest", "meal");
  /** Ten days or so of time in March, across the change of clocks. */
  const spans = fc
    .array(fc.tuple(fc.integer({ min: 0, max: 900 }), MINUTES, kinds), { maxLength: 16 })
    .map((parts) => {
      let at = Date.parse("2026-03-02T14:00:30Z");
      return parts.map(([gap, length, kind]) => {
        const start = at + gap * 60_000;
        at = start + length * 60_000;
        // safe because the kinds are those of a span
        return {
          start: new Date(start).toISOString(),
          end: new Date(at).toISOString(),
          kind: kind as "work",
        };
      });
    });
  /** A statement asks the zone hundreds of times, which is slow. */
  const runs = { numRuns: 30 };
  const policies = fc.constantFrom(
    "us-federal" as const,
    "us-california" as const,
    "eu-working-time" as const,
    {
      attribution: "shift-start" as const,
      workweek: { startsOn: "wednesday" as const, at: "02:30" },
      rounding: { mode: "nearest" as const, minutes: 6 as const },
      overtime: { weekly: [{ overHours: 37.5, bucket: "double" as const }] },
      premiums: [{ code: "night", from: "22:00", to: "06:00" }],
    },
  );
  const asked = (policy: unknown, time: unknown, from = "2026-02-20", to = "2026-04-20") =>
    payStatement(payRequest.parse({ timeZone: "America/New_York", from, to, policy, spans: time }));

  test("for any time, every paid second is in one bucket and has one reason", () => {
    const reasons = ["regular", "daily", "weekly", "seventh-day"];
    fc.assert(
      fc.property(spans, policies, (time, policy) => {
        const { workweeks, totals } = asked(policy, time);
        for (const { days } of workweeks) {
          for (const { paidSeconds, buckets, trail } of days) {
            expect(buckets.regular + buckets.overtime + buckets.double).toBe(paidSeconds);
            const steps = trail.filter(({ rule }) => reasons.includes(rule));
            expect(steps.reduce((total, { seconds }) => total + seconds, 0)).toBe(paidSeconds);
          }
        }
        const paid = workweeks.map((week) => week.totals.paidSeconds);
        expect(paid.reduce((a, b) => a + b, 0)).toBe(totals.paidSeconds);
      }),
      runs,
    );
  });
  test("for any time, its order changes nothing, and without rounding all worked time is paid", () => {
    fc.assert(
      fc.property(spans, (time) => {
        const answer = asked("us-california", time);
        expect(asked("us-california", time.toReversed())).toEqual(answer);
        for (const { days } of answer.workweeks) {
          for (const day of days) expect(day.workedSeconds).toBe(day.paidSeconds);
        }
      }),
      runs,
    );
  });
  test("for any time and any day, two ranges sum to the one that they make up", () => {
    fc.assert(
      fc.property(spans, policies, fc.integer({ min: 1, max: 28 }), (time, policy, day) => {
        const cut = `2026-03-${String(day).padStart(2, "0")}`;
        const whole = asked(policy, time).totals;
        const parts = [
          asked(policy, time, "2026-02-20", cut).totals,
          asked(policy, time, cut, "2026-04-20").totals,
        ];
        for (const bucket of ["regular", "overtime", "double"] as const) {
          expect(parts[0]!.buckets[bucket] + parts[1]!.buckets[bucket]).toBe(whole.buckets[bucket]);
        }
      }),
      runs,
    );
  });
});
