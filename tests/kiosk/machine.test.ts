import "fake-indexeddb/auto";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { type Machine, runKiosk } from "@/kiosk/machine";
import type { KioskState } from "@/lib/bench/schema";
import { badgeCode } from "@/lib/codes/badge-code";
import { readBox, toBase64 } from "@/lib/kiosks/seal-format";
import type { ClockEvent, EventBatch } from "@/lib/ledger/schema";
import type { Tap } from "@/lib/taps/inputs";
import { benchOf, cell, device, NIA, numbered, tickets } from "@/tests/make/bench";
import { uuidOf } from "./records";

/** A server in a few lines: it keeps what is handed in, and can be away. */
class FakeServer {
  isAway = false;
  isPinRight = true;
  /** The kiosk was taken away from the office's list; a new enrolment puts it back. */
  isUnknown = false;
  readonly batches: EventBatch[] = [];
  sealKey = { kid: "k1", key: toBase64(new Uint8Array(32).fill(9)) };

  readonly fetcher = async (url: Parameters<typeof fetch>[0], init?: RequestInit) => {
    if (this.isAway) throw new TypeError("away");
    const body = init?.body ? JSON.parse(String(init.body)) : null;
    return this.answer(new URL(String(url), "http://kiosk.test").pathname, body);
  };

  get booked(): ClockEvent[] {
    return this.batches.flatMap(({ events }) => events as ClockEvent[]);
  }

  private answer(path: string, body: Record<string, unknown> | null): Response {
    const serverTime = new Date().toISOString();
    if (path === "/api/kiosk/enrol") this.isUnknown = false;
    if (this.isUnknown) return problem(401, "unauthenticated");
    switch (path) {
      case "/api/kiosk/time":
        return Response.json({ serverTime, build: "b1", sealKey: this.sealKey });
      case "/api/kiosk/cell":
        return Response.json(cell);
      case "/api/kiosk/enrol":
        return Response.json({ ...device, sealKey: this.sealKey, serverTime });
      case "/api/kiosk/sign-in":
        return this.isPinRight ? this.signedIn(body) : problem(401, "unauthenticated");
      case "/api/kiosk/bench":
        return Response.json(benchOf());
      case "/api/kiosk/events":
        return this.book(body as unknown as EventBatch, serverTime);
      default:
        return this.ticket(path);
    }
  }

  private signedIn(body: Record<string, unknown> | null): Response {
    const worker = { worker: String(body?.worker), name: "Nia Vale", language: "en" };
    return Response.json({
      token: "token",
      worker: { ...worker, role: "worker" },
      bench: benchOf(),
    });
  }

  private book(batch: EventBatch, serverTime: string): Response {
    this.batches.push(batch);
    const events = batch.events as ClockEvent[];
    const results = events.map(({ id }) => ({ id, verdict: "booked", looseEnds: [] }));
    return Response.json({ results, serverTime });
  }

  private ticket(path: string): Response {
    const ticket = tickets.find((each) => path.endsWith(each.ticket));
    return ticket ? Response.json(ticket) : problem(404, "notFound");
  }
}

function problem(status: number, code: string): Response {
  return Response.json({ type: `urn:bookmatch:problem:${code}`, status }, { status });
}

let machine: Machine | undefined;
let made = 0;
let stores = 0;

/** A browser that keeps storage and tells nothing of a battery. */
const navigator = { storage: { persist: () => Promise.resolve(true) } };

beforeEach(() => vi.stubGlobal("navigator", navigator));

afterEach(() => {
  machine?.stop();
  vi.unstubAllGlobals();
});

async function start(server: FakeServer, storeName: string): Promise<Machine> {
  machine?.stop();
  machine = await runKiosk({
    fetcher: server.fetcher as typeof fetch,
    clocks: { wallMs: () => Date.now(), monotonicMs: () => performance.now() },
    newId: () => uuidOf(500 + made++),
    random: () => 0,
    reload: () => undefined,
    storeName,
  });
  return machine;
}

/** Resolves once the kiosk's state is as asked. */
function until(running: Machine, isSo: (state: KioskState) => boolean): Promise<KioskState> {
  return new Promise((done) => {
    const look = () => {
      if (!isSo(running.state())) return false;
      done(running.state());
      return true;
    };
    if (look()) return;
    const stop = running.subscribe(() => {
      if (look()) stop();
    });
  });
}

const screenIs = (at: string) => (state: KioskState) => state.screen.at === at;
const isAnswered = ({ pending }: KioskState) => pending.length === 0;

function send(running: Machine, ...taps: Tap[]): void {
  for (const tap of taps) running.send(tap);
}

function keyIn(running: Machine, digits: string): void {
  for (const digit of digits) running.send({ on: "digit", digit });
}

/** A kiosk that was just enrolled, loaded anew. */
async function enrolled(server: FakeServer): Promise<{ running: Machine; storeName: string }> {
  stores += 1;
  const storeName = `machine-${stores}`;
  const fresh = await start(server, storeName);
  send(fresh, { on: "enrol", code: "K7QF-3MZ9" });
  await until(fresh, (state) => state.screen.at === "enrol" && state.screen.isDone);
  return { running: await start(server, storeName), storeName };
}

async function signIn(running: Machine): Promise<void> {
  keyIn(running, NIA);
  send(running, { on: "submit" });
  keyIn(running, "271828");
  await until(running, screenIs("start-shift"));
}

describe("runKiosk", () => {
  test("from enrolment to a shift that the server has booked", async () => {
    const server = new FakeServer();
    const { running } = await enrolled(server);
    expect(running.state().device?.name).toBe(device.name);
    await signIn(running);
    send(running, { on: "start-shift" });
    const done = await until(running, screenIs("done"));
    expect(done.pending).toHaveLength(1);
    await until(running, isAnswered);
    expect(server.booked.map(({ kind }) => kind)).toEqual(["shift-start"]);
    expect(server.booked[0]?.clock.offsetMs).not.toBeNull();
  });

  test("a wrong PIN is keyed anew", async () => {
    const server = new FakeServer();
    server.isPinRight = false;
    const { running } = await enrolled(server);
    keyIn(running, NIA);
    send(running, { on: "submit" });
    keyIn(running, "111111");
    const state = await until(running, ({ screen }) => screen.at === "pin" && screen.says !== null);
    expect(state.screen).toMatchObject({ says: "wrong", digits: "" });
  });

  test("a server that goes away loses nothing, and books it once when it is back", async () => {
    const server = new FakeServer();
    const { running } = await enrolled(server);
    await signIn(running);
    server.isAway = true;
    send(running, { on: "start-shift" });
    await until(running, screenIs("done"));
    await until(running, ({ link }) => link.is === "away");
    expect(running.state().pending).toHaveLength(1);
    server.isAway = false;
    running.wake();
    await until(running, isAnswered);
    expect(server.booked.map(({ kind }) => kind)).toEqual(["shift-start"]);
  });

  test("a page loaded in the middle finds the record and the session, and hands it in once", async () => {
    const server = new FakeServer();
    const { running, storeName } = await enrolled(server);
    await signIn(running);
    server.isAway = true;
    send(running, { on: "start-shift" });
    await until(running, screenIs("done"));
    const [kept] = running.state().pending;
    const again = await start(server, storeName);
    expect(again.state().pending).toEqual([kept]);
    again.send({ on: "scan", text: badgeCode(NIA) });
    expect(again.state().screen.at).toBe("bench");
    server.isAway = false;
    again.wake();
    await until(again, isAnswered);
    expect(server.booked.map(({ id }) => id)).toEqual([kept?.id]);
  });

  test("a PIN keyed while the server is away is sealed, and sent along with its records", async () => {
    const server = new FakeServer();
    const { running } = await enrolled(server);
    await until(running, ({ device: known }) => known?.sealKey.kid === "k1");
    server.isAway = true;
    await signIn(running);
    send(running, { on: "start-shift" });
    await until(running, screenIs("done"));
    server.isAway = false;
    running.wake();
    await until(running, isAnswered);
    const [batch] = server.batches;
    const [sealed] = batch?.sessions ?? [];
    expect(sealed?.worker).toBe(NIA);
    expect(sealed?.session).toBe(server.booked[0]?.session);
    expect(readBox(sealed?.sealed ?? "")?.kid).toBe("k1");
    expect(JSON.stringify(batch)).not.toContain("271828");
  });

  test("a ticket of the cell is found while the server is away, another one is not", async () => {
    const server = new FakeServer();
    const { running } = await enrolled(server);
    await until(running, (state) => state.cell !== null);
    await signIn(running);
    send(running, { on: "start-shift" });
    await until(running, screenIs("done"));
    server.isAway = true;
    send(running, { on: "scan-for", add: false });
    running.send({ on: "scan", text: `T${tickets[0]?.ticket}` });
    await until(running, screenIs("offer"));
    send(running, { on: "back" });
    keyIn(running, numbered("2699999"));
    send(running, { on: "submit" });
    const state = await until(running, ({ screen }) => screen.at === "scan" && !!screen.says);
    expect(state.screen).toMatchObject({ says: { what: "away" } });
  });

  test("a kiosk is not made another one while its records wait, and forgets none", async () => {
    const server = new FakeServer();
    const { running } = await enrolled(server);
    await signIn(running);
    server.isAway = true;
    send(running, { on: "start-shift" });
    await until(running, screenIs("done"));
    await until(running, ({ link }) => link.is === "away");
    send(running, { on: "leave" }, { on: "show-enrol" }, { on: "enrol", code: "K7QF-3MZ9" });
    const refused = await until(running, ({ screen }) => screen.at === "enrol" && !screen.busy);
    expect(refused.screen).toMatchObject({ says: "kept", isDone: false });
    expect(refused.pending).toHaveLength(1);
    server.isAway = false;
    running.wake();
    await until(running, isAnswered);
    expect(server.booked.map(({ kind }) => kind)).toEqual(["shift-start"]);
    send(running, { on: "enrol", code: "K7QF-3MZ9" });
    await until(running, ({ screen }) => screen.at === "enrol" && screen.isDone);
  });

  test("a badge opens nothing on a kiosk that was made another one", async () => {
    const server = new FakeServer();
    const { running, storeName } = await enrolled(server);
    await signIn(running);
    send(running, { on: "leave" }, { on: "show-enrol" }, { on: "enrol", code: "K7QF-3MZ9" });
    await until(running, ({ screen }) => screen.at === "enrol" && screen.isDone);
    const again = await start(server, storeName);
    again.send({ on: "scan", text: badgeCode(NIA) });
    expect(again.state().screen).toMatchObject({ at: "pin", worker: NIA });
  });

  test("a tablet that the server knows no more is enrolled anew, and its records go in then", async () => {
    const server = new FakeServer();
    const { running } = await enrolled(server);
    await signIn(running);
    server.isUnknown = true;
    send(running, { on: "start-shift" });
    await until(running, ({ link }) => link.is === "unknown-device");
    expect(running.state().pending).toHaveLength(1);
    send(running, { on: "leave" }, { on: "show-enrol" }, { on: "enrol", code: "K7QF-3MZ9" });
    await until(running, ({ screen }) => screen.at === "enrol" && screen.isDone);
    running.wake();
    await until(running, isAnswered);
    expect(server.booked.map(({ kind }) => kind)).toEqual(["shift-start"]);
  });

  test("a tablet that breaks while a person waits says that it cannot be done now", async () => {
    const broken = { persist: () => Promise.reject(new Error("no storage")) };
    vi.stubGlobal("navigator", { storage: broken });
    stores += 1;
    const running = await start(new FakeServer(), `machine-${stores}`);
    send(running, { on: "enrol", code: "K7QF-3MZ9" });
    const state = await until(running, ({ screen }) => screen.at === "enrol" && !!screen.says);
    expect(state.screen).toMatchObject({ says: "away", busy: false });
  });
});
