import { eq } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import { beforeAll, describe, expect, test } from "vitest";
import { GET as getCell } from "@/app/api/kiosk/cell/route";
import { POST as sendEvents } from "@/app/api/kiosk/events/route";
import { POST as signIn } from "@/app/api/kiosk/sign-in/route";
import { GET as getTicket } from "@/app/api/kiosk/tickets/[code]/route";
import { clockEvents } from "@/db/ledger/tables";
import { routingOperations, routingSteps, routings } from "@/db/standards/tables";
import { rebuildTickets } from "@/db/tickets/commands";
import { ticketNumberOf } from "@/lib/codes/ticket-code";
import { kioskCell, kioskTicket } from "@/lib/kiosks/schema";
import type { EventBody } from "@/lib/ledger/schema";
import { sum } from "@/lib/sum";
import { call } from "@/tests/make/call";
import { type Factory, makeFactory, makeTicket, makeWorker } from "@/tests/make/factory";
import { givePin, type MadeKiosk, makeKiosk, tap } from "@/tests/make/kiosk";
import { ownDatabase } from "@/tests/setup/db";

const own = ownDatabase();
const [ticket, other] = [ticketNumberOf(26, 17), ticketNumberOf(26, 18)];
const item = { ticket, operation: "010" };
let factory: Factory;
let kiosk: MadeKiosk;
let bearer = "";

beforeAll(async () => {
  factory = await makeFactory(own.db);
  kiosk = await makeKiosk(factory);
  await givePin(factory, "271828");
  await makeWorker(factory, "1077");
  await makeRouting();
  await makeTicket(factory, { number: ticket });
  await makeTicket(factory, { number: other });
  await rebuildTickets({ db: own.db, siteId: factory.siteId });
  const body = { session: uuid(), worker: "1042", pin: "271828" };
  const { json } = await call(signIn, { path: "/api/kiosk/sign-in", cookie: kiosk.cookie, body });
  bearer = json.token ?? "";
});

/** The Heron's operation 010 is built in three steps of 8, 6 and 10 minutes. */
async function makeRouting(): Promise<void> {
  const { db, siteId, modelId, operationIds } = factory;
  const [routingId, routingOperationId] = [uuid(), uuid()];
  await db.insert(routings).values({ siteId, id: routingId, modelId, revision: 1 });
  await db.insert(routingOperations).values({
    siteId,
    id: routingOperationId,
    routingId,
    operationId: operationIds[0],
    position: 0,
  });
  const rows = [
    { step: "1", name: "Fit bridge", seconds: 480 },
    { step: "2", name: "Tuners", seconds: 360 },
    { step: "3", name: "Solder", seconds: 600 },
  ];
  await db
    .insert(routingSteps)
    .values(
      rows.map((row, position) => ({ ...row, siteId, id: uuid(), routingOperationId, position })),
    );
}

const stepTap = (kind: "step-done" | "step-open" | "step-skip", step: string): EventBody => ({
  kind,
  ...item,
  step,
});

async function send(...events: ReturnType<typeof tap>[]) {
  const body = { events, deviceTime: "2026-05-14T17:00:00Z" };
  const { json } = await call(sendEvents, {
    path: "/api/kiosk/events",
    cookie: kiosk.cookie,
    body,
  });
  return (json.results as unknown as { verdict: string }[]).map(({ verdict }) => verdict);
}

async function operation() {
  const { json } = await call(getTicket, {
    path: `/api/kiosk/tickets/${ticket}`,
    params: { code: ticket },
    cookie: kiosk.cookie,
    bearer,
  });
  const [first] = kioskTicket.parse(json).operations;
  return { ...first!, sheet: first!.sheet! };
}

describe("the sheet of an operation", () => {
  test("lists the steps; their standards sum to the operation's", async () => {
    const { sheet } = await operation();
    expect(sheet.steps.map(({ name, standardSeconds }) => [name, standardSeconds])).toEqual([
      ["Fit bridge", 800],
      ["Tuners", 600],
      ["Solder", 1000],
    ]);
    expect(sheet.notTappedSeconds).toBe(0);
  });

  test("every second is a step's or none's yet, past a break, other work and a shared hour", async () => {
    const both = [item, { ticket: other, operation: "010" }];
    const verdicts = await send(
      tap(kiosk, "08:00", { kind: "shift-start" }),
      tap(kiosk, "08:00", { kind: "work", activity: "run", items: [item] }),
      tap(kiosk, "08:10", stepTap("step-done", "1")),
      tap(kiosk, "08:12", { kind: "break-start", break: "rest" }),
      tap(kiosk, "08:22", { kind: "break-end", break: "rest" }),
      tap(kiosk, "08:25", { kind: "indirect", code: "cleaning" }),
      tap(kiosk, "08:40", { kind: "work", activity: "run", items: both }),
      tap(kiosk, "09:00", stepTap("step-done", "3")),
      tap(kiosk, "09:00:25", stepTap("step-done", "2")),
      tap(kiosk, "09:10", { kind: "pause", items: both }),
    );
    expect(new Set(verdicts)).toEqual(new Set(["booked"]));
    const { sheet, actualSeconds } = await operation();
    const seconds = sheet.steps.map((step) => step.actualSeconds);
    expect(sum(seconds) + sheet.notTappedSeconds).toBe(actualSeconds);
    // 2 + 3 minutes alone and half of 20 min 25 s, shared as 360 : 600
    expect(seconds).toEqual([600, 342, 570]);
    expect(sheet.notTappedSeconds).toBe(288);
    expect(sheet.steps.map(({ together }) => together)).toEqual([false, true, true]);
  });

  test("a step is booked with its weight, so that another routing never shares it anew", async () => {
    const rows = await own.db
      .select({ weights: clockEvents.weights })
      .from(clockEvents)
      .where(eq(clockEvents.kind, "step-done"));
    expect(rows.map(({ weights }) => weights)).toEqual([[480], [600], [360]]);
  });

  test("one that is taken back is open, one that does not apply says why, an undo leaves nothing", async () => {
    const skip = tap(kiosk, "09:12", stepTap("step-skip", "2"), { note: "not-on-this" });
    const slip = tap(kiosk, "09:13", stepTap("step-done", "2"));
    await send(
      tap(kiosk, "09:11", stepTap("step-open", "1")),
      skip,
      slip,
      tap(kiosk, "09:13:05", { kind: "undo", event: slip.id }),
    );
    const { sheet, actualSeconds } = await operation();
    expect(sheet.steps.map(({ state, reason }) => [state, reason])).toEqual([
      ["open", null],
      ["skipped", "not-on-this"],
      ["done", null],
    ]);
    const seconds = sheet.steps.map((step) => step.actualSeconds);
    expect(sum(seconds) + sheet.notTappedSeconds).toBe(actualSeconds);
  });

  test("what is handed over asks the colleague, until the operation is begun again", async () => {
    await send(
      tap(kiosk, "09:20", { kind: "work", activity: "run", items: [item] }),
      tap(kiosk, "09:30", { kind: "hand-over", ...item, to: "1077" }, { note: "shift-ends" }),
    );
    expect((await operation()).sheet.handOver).toMatchObject({
      from: "1042",
      to: "1077",
      reason: "shift-ends",
    });
    await send(
      tap(kiosk, "09:40", { kind: "work", activity: "run", items: [item] }),
      tap(kiosk, "09:50", { kind: "pause", items: [item] }),
    );
    expect((await operation()).sheet.handOver).toBeNull();
  });

  test("a tablet keeps the sheets of its cells, without what runs", async () => {
    const request = new Request("http://localhost/api/kiosk/cell", {
      headers: { cookie: kiosk.cookie },
    });
    const answer = await getCell(request, { params: Promise.resolve({}) });
    const kept = kioskCell.parse(await answer.json());
    const sheets = kept.tickets.map(({ operations }) => operations.map((one) => one.sheet));
    expect(sheets.map(([first]) => first?.steps.length)).toEqual([3, 3]);
    expect(sheets.flatMap(([, ...more]) => more).filter(Boolean)).toEqual([]);
    const [first] = kept.tickets.find((each) => each.ticket === ticket)!.operations;
    const sheet = first!.sheet!;
    expect(sum(sheet.steps.map((step) => step.actualSeconds)) + sheet.notTappedSeconds).toBe(
      first!.actualSeconds,
    );
  });
});
