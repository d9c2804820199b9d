import "fake-indexeddb/auto";
import { beforeEach, describe, expect, test } from "vitest";
import { openOutbox } from "@/kiosk/outbox";
import {
  endSessions,
  forgetSpentSessions,
  keepSession,
  listOpenSessions,
  SESSION_MAX_MS,
  sealedSessions,
} from "@/kiosk/sessions";
import { openStore, type Store } from "@/kiosk/store";
import type { BenchSession } from "@/lib/bench/schema";
import { draft, uuidOf } from "./records";

let store: Store;
let files = 0;

beforeEach(async () => {
  files += 1;
  store = await openStore(() => undefined, `sessions-${files}`);
});

const session = (n: number, change: Partial<BenchSession> = {}): BenchSession => ({
  session: uuidOf(n),
  worker: "1042",
  name: "Nia Vale",
  language: "en",
  role: "worker",
  openedMs: n,
  endedMs: null,
  token: "token",
  sealed: null,
  ...change,
});

describe("listOpenSessions", () => {
  test("gives each worker's latest session, and none that ended or is older than 16 h", async () => {
    await keepSession(store, session(1));
    await keepSession(store, session(2));
    await keepSession(store, session(3, { worker: "1043" }));
    await endSessions(store, "1043", 10);
    expect((await listOpenSessions(store, 10)).map((open) => open.session)).toEqual([uuidOf(2)]);
    expect(await listOpenSessions(store, 2 + SESSION_MAX_MS)).toEqual([]);
  });
});

describe("sealedSessions", () => {
  test("gives credentials only for sessions without a token", async () => {
    await keepSession(store, session(1));
    await keepSession(store, session(2, { token: null, sealed: "v1.k.abc" }));
    expect(await sealedSessions(store, [uuidOf(1), uuidOf(2), uuidOf(3)])).toEqual([
      { session: uuidOf(2), worker: "1042", sealed: "v1.k.abc" },
    ]);
  });
});

describe("forgetSpentSessions", () => {
  test("keeps an ended session for as long as a record of it waits", async () => {
    await keepSession(store, session(9000, { sealed: "v1.k.abc", token: null }));
    const events = await openOutbox(store).add([draft(1)]);
    await endSessions(store, "1042", 20);
    await forgetSpentSessions(store, 30);
    expect(await sealedSessions(store, [uuidOf(9000)])).toHaveLength(1);
    const result = { id: uuidOf(1), verdict: "booked" as const, looseEnds: [] };
    await openOutbox(store).settle([{ event: events[0]!, result }]);
    await forgetSpentSessions(store, 40);
    expect(await sealedSessions(store, [uuidOf(9000)])).toHaveLength(0);
  });
});
