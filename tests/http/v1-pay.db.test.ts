import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { POST as pay } from "@/app/api/v1/calculate/pay/route";
import { payAnswer } from "@/lib/pay/answer";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey } from "@/tests/make/factory";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { payroll: "", planner: "", admin: "" };

beforeAll(async () => {
  const factory = await makeFactory(own.db);
  for (const role of ["payroll", "planner", "admin"] as const) {
    keys[role] = await makeKey(factory, role, hashSecret);
  }
});

const ask = (body: unknown, bearer = keys.payroll) =>
  call(pay, { path: "/api/v1/calculate/pay", body, bearer });

/** The example of the HTTP contract. */
const example = {
  timeZone: "America/Los_Angeles",
  from: "2026-03-01",
  to: "2026-03-15",
  policy: {
    workweek: { startsOn: "sunday", at: "00:00" },
    attribution: "calendar-day",
    newShiftAfterMinutes: 240,
    rounding: { mode: "none" },
    breaks: {
      restPaidUpToMinutes: 20,
      restLimitAnnounced: false,
      mealUnpaidFromMinutes: 30,
      mealAtMostMinutes: 75,
    },
    overtime: {
      daily: [
        { overHours: 8, bucket: "overtime" },
        { overHours: 12, bucket: "double" },
      ],
      weekly: [{ overHours: 40, bucket: "overtime" }],
      seventhDay: [
        { overHours: 0, bucket: "overtime" },
        { overHours: 8, bucket: "double" },
      ],
    },
    premiums: [
      { code: "night", from: "22:00", to: "06:00", days: ["monday", "tuesday"], dates: [] },
    ],
    flatSum: "all-hours",
  },
  spans: [{ start: "2026-03-02T08:00:00-08:00", end: "2026-03-02T12:00:00-08:00", kind: "work" }],
};

describe("POST /api/v1/calculate/pay: 200", () => {
  test("answers the contract's example as the contract does", async () => {
    const answer = await ask(example);
    expect(answer.status).toBe(200);
    const sums = {
      paidSeconds: 14_400,
      buckets: { regular: 14_400, overtime: 0, double: 0 },
      premiums: { night: 0 },
    };
    expect(payAnswer.strict().parse(answer.json)).toEqual({
      workweeks: [
        {
          start: "2026-03-01T00:00:00-08:00",
          end: "2026-03-08T00:00:00-08:00",
          days: [
            {
              date: "2026-03-02",
              workedSeconds: 14_400,
              ...sums,
              trail: [
                {
                  rule: "regular",
                  seconds: 14_400,
                  text: "4 h 00 min within every limit: regular.",
                },
              ],
            },
          ],
          totals: sums,
        },
      ],
      totals: sums,
      warnings: [],
    });
  });
  test.each(["us-federal", "us-california", "eu-working-time", "straight"])(
    "takes the preset %s by its name",
    async (policy) => {
      const answer = await ask({ ...example, policy });
      expect(answer).toMatchObject({ status: 200, json: { totals: { paidSeconds: 14_400 } } });
    },
  );
});

describe("POST /api/v1/calculate/pay: refusals", () => {
  test("400: what is not JSON", async () => {
    expect((await ask('{"timeZone":')).status).toBe(400);
  });
  test("401: an unknown key", async () => {
    expect((await ask(example, "bm_unknown")).status).toBe(401);
  });
  test.each(["planner", "admin"] as const)("403: to %s", async (role) => {
    expect((await ask(example, keys[role])).status).toBe(403);
  });
  test("413: over 1 MB", async () => {
    expect((await ask({ ...example, note: "x".repeat(1_000_000) })).status).toBe(413);
  });
  const [span] = example.spans;
  test.each([
    [{ timeZone: "Mars/Olympus" }, "timeZone"],
    [{ to: "2026-03-01" }, "to"],
    [{ policy: "us-nowhere" }, "policy"],
    [{ policy: { rounding: { mode: "nearest", minutes: 7 } } }, "policy.rounding.minutes"],
    [{ policy: { overtimes: {} } }, "policy.overtimes"],
    [{ spans: [span, span] }, "spans.1"],
    [{ spans: [{ ...span, kind: "nap" }] }, "spans.0.kind"],
    [{ extras: [{ workweek: "2026-03-02", amount: "46.00" }] }, "extras.0.workweek"],
    [{ worker: "1042" }, "worker"],
  ])("422: %j, naming %s", async (change, path) => {
    const answer = await ask({ ...example, ...change });
    expect(answer.status).toBe(422);
    expect(answer.type).toBe("application/problem+json");
    expect(answer.json.errors).toMatchObject([{ path }]);
  });
});
