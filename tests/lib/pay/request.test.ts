import { describe, expect, test } from "vitest";
import { check } from "@/app/_server/read-body";
import { payRequest } from "@/lib/pay/request";
import { askedFor, type LocalSpan } from "@/tests/make/pay";

const day: LocalSpan[] = [["2026-06-09T08:00", "2026-06-09T12:00"]];
const good = askedFor({ spans: day });
const span = good.spans[0]!;
/** Where a request is refused, as dotted paths with the message. */
const refused = (request: unknown) =>
  payRequest
    .safeParse(request)
    .error?.issues.map(({ path, message }) => `${path.join(".")}: ${message}`) ?? [];

describe("payRequest", () => {
  test("takes spans in any order that touch", () => {
    const spans: LocalSpan[] = [["2026-06-09T12:00", "2026-06-09T12:30", "meal"], ...day];
    expect(refused(askedFor({ spans }))).toEqual([]);
  });
  test("takes rates on all work, and none on its breaks", () => {
    const spans: LocalSpan[] = [
      ["2026-06-09T08:00", "2026-06-09T12:00", "work", "14.25"],
      ["2026-06-09T12:00", "2026-06-09T12:30", "meal"],
    ];
    expect(refused(askedFor({ spans }))).toEqual([]);
  });
  test("takes an extra for a workweek that the range only cuts", () => {
    const extras = [{ workweek: "2026-06-07", amount: "46.00" }];
    const cut = { spans: day, from: "2026-06-13", to: "2026-06-14", extras };
    expect(payRequest.parse(askedFor(cut)).extras[0]?.kind).toBe("ordinary");
  });
  test.each([
    [{ timeZone: "Mars/Olympus" }, "timeZone: Give an IANA time zone"],
    [{ timeZone: "+02:00" }, "timeZone: Give an IANA time zone"],
    [{ to: good.from }, "to: Give a `to` after `from`"],
    [{ to: "2028-01-01" }, "to: Ask for at most"],
    [{ from: "2026-06-31" }, "from: "],
    [{ from: "1969-06-01" }, "from: Give a date from 1970"],
    [{ policy: "us-nowhere" }, "policy: Give a policy, or one of: us-federal"],
    [{ policy: undefined }, "policy: "],
    [{ bonus: 1 }, ': Unrecognized key: "bonus"'],
    [{ spans: [{ ...span, kind: "nap" }] }, "spans.0.kind: "],
    [{ spans: [{ ...span, start: "2026-06-09 08:00" }] }, "spans.0.start: Give an RFC 3339"],
    [{ spans: [{ ...span, end: span.start }] }, "spans.0: A span ends after it starts"],
    [{ spans: [{ ...span, end: "2026-07-11T08:00:00Z" }] }, "spans.0: Give spans of at most 31"],
    [
      { spans: [span, { ...span, start: "2023-06-03T08:00:00Z", end: "2023-06-03T09:00:00Z" }] },
      "spans.0: Give the time of at most three years",
    ],
    [{ spans: [{ ...span, rate: 14 }] }, "spans.0.rate: "],
    [{ spans: [{ ...span, rate: "-1" }] }, "spans.0.rate: Give a decimal as text"],
    [{ spans: [{ ...span, rate: "1e3" }] }, "spans.0.rate: Give a decimal as text"],
    [{ extras: [{ workweek: "2026-06-07", amount: "1", kind: "gift" }] }, "extras.0.kind: "],
    [{ extras: [{ workweek: "2026-06-08", amount: "1" }] }, "extras.0.workweek: Name a workweek"],
    [{ extras: [{ workweek: "2026-07-05", amount: "1" }] }, "extras.0.workweek: Name a workweek"],
    [{ extras: [{ workweek: "2026-05-24", amount: "1" }] }, "extras.0.workweek: Name a workweek"],
  ])("refuses %j", (change, message) => {
    expect(refused({ ...good, ...change })[0]).toContain(message);
  });
  test("refuses spans that overlap, by less than a second too, naming the later", () => {
    const later = { ...span, start: "2026-06-09T18:59:59.9Z", end: "2026-06-09T20:00:00Z" };
    expect(refused({ ...good, spans: [later, span] })).toEqual([
      "spans.0: This span overlaps spans.1: they may only touch.",
    ]);
  });
  test("refuses a rate on some of the work only, or on breaks alone", () => {
    const some = [
      { ...span, rate: "14" },
      { ...span, start: span.end, end: "2026-06-09T20:00:00Z" },
    ];
    const rest = {
      ...span,
      start: span.end,
      end: "2026-06-09T19:10:00Z",
      kind: "rest",
      rate: "14",
    };
    const message = "All work carries a rate, or none does.";
    expect(refused({ ...good, spans: some })).toEqual([`spans.1.rate: ${message}`]);
    expect(refused({ ...good, spans: [span, rest] })).toEqual([`spans.0.rate: ${message}`]);
  });
  test.each([
    [{ rounding: { mode: "nearest", minutes: 7 } }, "rounding.minutes"],
    [{ rounding: { mode: "down", minutes: 15 } }, "rounding.mode"],
    [{ breaks: { mealUnpaidFromMinutes: 30, mealAtMostMinutes: 20 } }, "breaks.mealAtMostMinutes"],
    [{ breaks: { restPaidUpToMinutes: 7.5 } }, "breaks.restPaidUpToMinutes"],
    [
      { overtime: { daily: [{ overHours: -1, bucket: "overtime" }] } },
      "overtime.daily.0.overHours",
    ],
    [{ overtime: { daily: [{ overHours: 8, bucket: "regular" }] } }, "overtime.daily.0.bucket"],
    [{ workweek: { startsOn: "Sunday" } }, "workweek.startsOn"],
    [{ workweek: { at: "24:00" } }, "workweek.at"],
    [{ premiums: [{ code: "night", from: "22:60" }] }, "premiums.0.from"],
    [{ premiums: [{ code: "__proto__ " }] }, "premiums.0.code"],
    [{ newShiftAfterMinutes: 0 }, "newShiftAfterMinutes"],
    [{ attribution: "shift-end" }, "attribution"],
  ])("refuses the policy %j at %s", (policy, path) => {
    const checked = check({ ...good, policy }, payRequest);
    const paths = checked.ok ? [] : checked.problem.errors?.map((error) => error.path);
    expect(paths).toEqual([`policy.${path}`]);
  });
});
