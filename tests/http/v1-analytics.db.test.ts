import { beforeAll, describe, expect, test } from "vitest";
import { hashSecret } from "@/app/_server/secret";
import { GET as byCell } from "@/app/api/v1/analytics/cells/route";
import { GET as byOperation } from "@/app/api/v1/analytics/operations/route";
import { bookEvents } from "@/db/ledger/commands";
import { sumMarked } from "@/db/seam/commands";
import { judgeMarkedTickets } from "@/db/tickets/commands";
import { cellsAnswer, operationsAnswer } from "@/lib/analytics/schema";
import { call } from "@/tests/make/call";
import { makeFactory, makeKey, makeTicket } from "@/tests/make/factory";
import { makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const keys = { planner: "", lead: "", payroll: "", elsewhere: "" };

/**
 * 14 May in the mill: 40 minutes on an operation that should take 40, which is counted, then half an
 * hour on one without a standard, which is not; a rest and a meeting.
 */
beforeAll(async () => {
  const factory = await makeFactory(own.db);
  const kiosk = await makeKiosk(factory);
  await makeTicket(factory, { number: "26000000" });
  const item = (operation: string) => ({ ticket: "26000000", operation });
  const count = { good: 1, rework: 0, scrap: 0, stop: true };
  const events = [
    tap(kiosk, "12:00", { kind: "shift-start" }),
    tap(kiosk, "12:00", { kind: "work", activity: "run", items: [item("010")] }),
    tap(kiosk, "12:40", { kind: "report", ...item("010"), ...count }),
    tap(kiosk, "12:40", { kind: "work", activity: "run", items: [item("020")] }),
    tap(kiosk, "13:10", { kind: "indirect", code: "meeting" }),
    tap(kiosk, "13:30", { kind: "break-start", break: "rest" }),
    tap(kiosk, "13:40", { kind: "break-end", break: "rest" }),
    tap(kiosk, "14:00", { kind: "shift-end" }),
  ];
  const receivedAt = new Date("2026-05-14T23:00:00Z");
  const scope = { db: own.db, siteId: factory.siteId };
  await bookEvents(scope, { kioskId: kiosk.kioskId, events, receivedAt });
  while ((await judgeMarkedTickets(own.db)) > 0);
  while ((await sumMarked(own.db)) > 0);
  for (const role of ["planner", "lead", "payroll"] as const) {
    keys[role] = await makeKey(factory, role, hashSecret);
  }
  keys.elsewhere = await makeKey(await makeFactory(own.db), "planner", hashSecret);
});

const days = "?from=2026-05-14&to=2026-05-15";
const operations = (query = days, bearer = keys.planner) =>
  call(byOperation, { path: `/api/v1/analytics/operations${query}`, bearer });
const cells = (query = days, bearer = keys.planner) =>
  call(byCell, { path: `/api/v1/analytics/cells${query}`, bearer });

describe("GET /api/v1/analytics/operations: 200", () => {
  const planed = {
    operation: "010",
    stage: "Mill",
    cell: "Mill",
    finished: 1,
    standardSeconds: 2400,
    actualSeconds: 2400,
    noStandardSeconds: 0,
    reworkSeconds: 0,
    efficiency: 1,
  };
  test("finished work is the usual basis", async () => {
    const answer = operationsAnswer.strict().parse((await operations()).json);
    expect(answer.items).toEqual([planed]);
    expect(answer.totals).toMatchObject({ finished: 1, actualSeconds: 2400, efficiency: 1 });
  });
  test("all time booked has what is not finished, and time without a standard apart", async () => {
    const answer = operationsAnswer.parse((await operations(`${days}&basis=booked`)).json);
    expect(answer.items).toEqual([
      planed,
      {
        ...planed,
        operation: "020",
        stage: "Neck",
        cell: "Neck",
        finished: 0,
        standardSeconds: null,
        actualSeconds: 1800,
        noStandardSeconds: 1800,
        efficiency: null,
      },
    ]);
    expect(answer.totals).toMatchObject({ actualSeconds: 4200, efficiency: 1 });
  });
  test.each([
    [`${days}&cell=Mill`, 1],
    [`${days}&cell=Neck`, 0],
    [`${days}&model=Heron`, 1],
    [`${days}&model=Wren`, 0],
    ["?from=2026-05-13&to=2026-05-14", 0],
    ["?from=2026-03-08&to=2026-03-09", 0],
    ["", 0],
  ])("%s finds %i", async (query, count) => {
    const answer = operationsAnswer.parse((await operations(query)).json);
    expect(answer.items).toHaveLength(count);
    if (count === 0) expect(answer.totals).toMatchObject({ actualSeconds: 0, efficiency: null });
  });
  test("a key of another site sees nothing of this one", async () => {
    expect((await operations(days, keys.elsewhere)).json.items).toEqual([]);
  });
});

describe("GET /api/v1/analytics/cells: 200", () => {
  const mill = {
    cell: "Mill",
    attendanceSeconds: 7200,
    directSeconds: 4200,
    indirectSeconds: 2400,
    reworkSeconds: 0,
    restSeconds: 600,
    mealSeconds: 0,
    unassignedSeconds: 0,
    earnedSeconds: 2400,
    matchedEarnedSeconds: 2400,
    matchedActualSeconds: 2400,
    noStandardSeconds: 0,
    efficiency: 1,
    utilization: 4200 / 7200,
    productivity: 2400 / 7200,
  };
  test("time belongs to the cell where it was worked, whosever the operation is", async () => {
    const answer = cellsAnswer.strict().parse((await cells()).json);
    const { cell: _, ...totals } = mill;
    expect(answer).toEqual({ items: [mill], totals });
  });
  test("utilization and productivity are booked figures on either basis", async () => {
    const { items } = cellsAnswer.parse((await cells(`${days}&basis=booked`)).json);
    expect(items).toEqual([{ ...mill, noStandardSeconds: 1800 }]);
  });
  test("a day without anyone is empty, without a ratio", async () => {
    const answer = cellsAnswer.parse((await cells("?from=2026-05-20&to=2026-05-21")).json);
    expect(answer.items).toEqual([]);
    expect(answer.totals).toMatchObject({ attendanceSeconds: 0, utilization: null });
  });
});

describe("GET /api/v1/analytics: 401, 403", () => {
  test.each([operations, cells])("without a good key, and to payroll", async (ask) => {
    expect((await ask(days, "bm_unknown")).status).toBe(401);
    expect((await ask(days, keys.payroll)).status).toBe(403);
    expect((await ask(days, keys.lead)).status).toBe(200);
  });
});

describe("GET /api/v1/analytics: 422", () => {
  test.each([
    ["?from=2026-05-14&to=2026-05-14", "to"],
    ["?from=2025-01-01&to=2026-05-14", "to"],
    ["?from=2026-02-30", "from"],
    [`${days}&basis=guess`, "basis"],
    [`${days}&person=1042`, "person"],
  ])("to %s, naming the parameter", async (query, path) => {
    for (const ask of [operations, cells]) {
      const answer = await ask(query);
      expect(answer.status).toBe(422);
      expect(answer.json.errors).toMatchObject([{ path }]);
    }
  });
});
