import "fake-indexeddb/auto";
import { beforeEach, describe, expect, test } from "vitest";
import { type Outbox, openOutbox, type Settled } from "@/kiosk/outbox";
import { type Sender, type SenderParts, startSender } from "@/kiosk/sender";
import type { Answer } from "@/kiosk/server";
import { openStore } from "@/kiosk/store";
import type { Link } from "@/lib/bench/schema";
import type { EventResult, EventResults } from "@/lib/kiosks/schema";
import type { ClockEvent, EventBatch } from "@/lib/ledger/schema";
import { draft, uuidOf } from "./records";

type Reply = (batch: EventBatch) => Answer<EventResults>;

let outbox: Outbox;
let files = 0;
let sent: string[][];
let waits: number[];
let settled: Settled[];
let links: Link["is"][];

beforeEach(async () => {
  files += 1;
  outbox = openOutbox(await openStore(() => undefined, `sender-${files}`));
  [sent, waits, settled, links] = [[], [], [], []];
});

const events = (batch: EventBatch) => batch.events as ClockEvent[];
const serverTime = "2026-05-14T07:00:00Z";
const answerWith = (results: EventResult[]): Answer<EventResults> => ({
  came: "answer",
  value: { results, serverTime },
  etag: null,
});
const book: Reply = (batch) =>
  answerWith(events(batch).map(({ id }) => ({ id, verdict: "booked", looseEnds: [] })));
const nothing: Reply = () => ({ came: "nothing" });
const problem =
  (status: number): Reply =>
  () => ({ came: "problem", status, code: "", retryAfterSeconds: null });

/** Runs the sender against scripted replies until it has nothing left to do or they run out. */
async function run(replies: Reply[], change: Partial<SenderParts> = {}): Promise<void> {
  await new Promise<void>((done) => {
    let sender: Sender | undefined;
    const finish = () => {
      sender?.stop();
      done();
    };
    sender = startSender({
      outbox,
      sealedFor: async () => [],
      post: async (batch) => {
        sent.push(events(batch).map(({ id }) => id));
        return (replies.shift() ?? nothing)(batch);
      },
      deviceTime: () => serverTime,
      nowMs: () => 0,
      wait: async (ms) => {
        waits.push(ms);
        if (ms === Number.POSITIVE_INFINITY || replies.length === 0) finish();
      },
      random: () => 1,
      onSettled: (results) => settled.push(...results),
      onLink: (link) => links.push(link),
      ...change,
    });
  });
}

describe("startSender", () => {
  test("hands the oldest records in as one batch and lets them go on their verdict", async () => {
    await outbox.add([draft(1), draft(2)]);
    await run([book]);
    expect(sent).toEqual([[uuidOf(1), uuidOf(2)]]);
    expect(settled.map(({ result }) => result.verdict)).toEqual(["booked", "booked"]);
    expect(await outbox.count()).toBe(0);
  });

  test("asks again with the same ids until it is answered, waiting longer each time", async () => {
    await outbox.add([draft(1)]);
    await run([nothing, nothing, nothing, book]);
    expect(sent).toEqual(Array(4).fill([uuidOf(1)]));
    expect(waits.slice(0, 3)).toEqual([1000, 2000, 4000]);
    expect(links).toEqual(["away", "away", "away", "connected"]);
  });

  test("never waits longer than 15 s for a server that is away", async () => {
    await outbox.add([draft(1)]);
    await run([...Array<Reply>(9).fill(nothing), book]);
    expect(Math.max(...waits.filter(Number.isFinite))).toBe(15_000);
  });

  test("an answer lost on the way is asked for again, and a duplicate settles the record", async () => {
    await outbox.add([draft(1)]);
    const lost: Reply = () => ({ came: "nothing" }); // booked, but the answer never arrived
    const duplicate: Reply = () =>
      answerWith([{ id: uuidOf(1), verdict: "duplicate", looseEnds: [] }]);
    await run([lost, duplicate]);
    expect(settled.map(({ result }) => result.verdict)).toEqual(["duplicate"]);
    expect(await outbox.count()).toBe(0);
  });

  test("a page that dies after the answer and before it was noted hands in again", async () => {
    await outbox.add([draft(1)]);
    const dies: Outbox = { ...outbox, settle: () => Promise.reject(new Error("page gone")) };
    await run([book], { outbox: dies });
    expect(await outbox.count()).toBe(1);
    await run([book]);
    expect(sent).toEqual([[uuidOf(1)], [uuidOf(1)]]);
    expect(await outbox.count()).toBe(0);
  });

  test("a record without a verdict stays, its neighbours leave", async () => {
    await outbox.add([draft(1), draft(2), draft(3)]);
    const partly: Reply = () =>
      answerWith([
        { id: uuidOf(1), verdict: "booked", looseEnds: [] },
        { id: uuidOf(3), verdict: "looseEnd", looseEnds: ["unproved"] },
      ]);
    await run([partly]);
    expect((await outbox.oldest(9)).map(({ id }) => id)).toEqual([uuidOf(2)]);
  });

  test("a record answered under another id is settled by its place in the batch", async () => {
    await outbox.add([draft(1)]);
    await run([
      () => answerWith([{ id: uuidOf(77), verdict: "looseEnd", looseEnds: ["unreadable"] }]),
    ]);
    expect(settled.map(({ event }) => event.id)).toEqual([uuidOf(1)]);
    expect(await outbox.count()).toBe(0);
  });

  test("a batch refused as a whole is halved until the record at fault stands aside", async () => {
    await outbox.add([draft(1), draft(2), draft(3), draft(4)]);
    const unlessThird: Reply = (batch) =>
      events(batch).some(({ id }) => id === uuidOf(3)) ? problem(422)(batch) : book(batch);
    await run(Array<Reply>(9).fill(unlessThird));
    expect(settled.map(({ event }) => event.id)).toEqual([uuidOf(1), uuidOf(2), uuidOf(4)]);
    expect(await outbox.oldest(9)).toEqual([]);
    expect((await outbox.oldest(9, true)).map(({ id }) => id)).toEqual([uuidOf(3)]);
  });

  test.each([401, 403])(
    "a tablet the server does not know (%i) keeps all and asks rarely",
    async (status) => {
      await outbox.add([draft(1)]);
      await run([problem(status)]);
      expect(links).toEqual(["unknown-device"]);
      expect(waits).toEqual([60_000]);
      expect(await outbox.count()).toBe(1);
    },
  );

  test.each([404, 429])(
    "an answer that says nothing of the records (%i) keeps them",
    async (status) => {
      await outbox.add([draft(1)]);
      await run([problem(status), book]);
      expect(sent).toHaveLength(2);
      expect(await outbox.count()).toBe(0);
    },
  );

  test("sends the sealed credentials of the sessions in the batch along", async () => {
    await outbox.add([draft(1)]);
    const sealed = { session: uuidOf(9000), worker: "1042", sealed: "v1.k.abc" };
    let carried: EventBatch["sessions"];
    await run(
      [
        (batch) => {
          carried = batch.sessions;
          return book(batch);
        },
      ],
      { sealedFor: async (sessions) => (sessions.includes(uuidOf(9000)) ? [sealed] : []) },
    );
    expect(carried).toEqual([sealed]);
  });

  test("a nudge during a request is not lost", async () => {
    await outbox.add([draft(1)]);
    const signals: boolean[] = [];
    let sender: Sender | undefined;
    await new Promise<void>((done) => {
      sender = startSender({
        outbox,
        sealedFor: async () => [],
        post: async (batch) => {
          sender?.nudge();
          return nothing(batch);
        },
        deviceTime: () => serverTime,
        nowMs: () => 0,
        wait: async (_ms, early) => {
          signals.push(early.aborted);
          sender?.stop();
          done();
        },
        random: () => 1,
        onSettled: () => undefined,
        onLink: () => undefined,
      });
    });
    expect(signals).toEqual([true]);
  });
});
