import { describe, expect, test } from "vitest";
import { effectMs, placeEvent } from "@/lib/ledger/place";
import type { ClockEvent } from "@/lib/ledger/schema";

const id = "01890a5d-ac96-774b-bcce-b302099a8057";
const ms = (text: string) => Date.parse(text);
const received = "2026-05-14T08:00:00Z";

function event(at: string, clock: Partial<ClockEvent["clock"]> = {}, body: object = {}) {
  const measured = { offsetMs: 0, uncertaintyMs: 0, boot: "b", monotonicMs: 1, seq: 1, ...clock };
  const head = { id, v: 1, session: id, worker: "1", at, clock: measured };
  return { ...head, kind: "shift-start", ...body } as ClockEvent;
}

const arrival = { receivedMs: ms(received), deviceMs: ms(received), boot: "b" };

describe("placeEvent", () => {
  test("an event of a measured clock counts at its own instant, and its raw reading is kept", () => {
    const placed = placeEvent(event("2026-05-14T07:00:00Z", { offsetMs: 90_000 }), arrival);
    expect(placed).toMatchObject({
      atMs: ms("2026-05-14T07:00:00Z"),
      rawMs: ms("2026-05-14T06:58:30Z"),
      isMeasured: true,
      isFuture: false,
    });
  });

  test("without a measurement it counts by how long ago the same run of the tablet made it", () => {
    const slow = { ...arrival, deviceMs: ms("2026-05-14T05:00:00Z") };
    const placed = placeEvent(event("2026-05-14T04:30:00Z", { offsetMs: null }), slow);
    expect(placed).toMatchObject({
      atMs: ms("2026-05-14T07:30:00Z"),
      rawMs: ms("2026-05-14T04:30:00Z"),
      isMeasured: true,
    });
  });

  test("without one and from another run it counts as it says, and is a question", () => {
    const other = { ...arrival, boot: "c", deviceMs: ms("2026-05-14T05:00:00Z") };
    const placed = placeEvent(event("2026-05-14T04:30:00Z", { offsetMs: null }), other);
    expect(placed).toMatchObject({ atMs: ms("2026-05-14T04:30:00Z"), isMeasured: false });
  });

  test.each([
    ["two minutes ahead", "2026-05-14T08:02:00.000Z", 0, false],
    ["a moment more", "2026-05-14T08:02:00.001Z", 0, true],
    ["a moment more that its uncertainty explains", "2026-05-14T08:02:30Z", 30_000, false],
    ["beyond its uncertainty", "2026-05-14T08:02:30.001Z", 30_000, true],
    ["hours ahead, whatever its uncertainty says", "2026-05-14T10:00:00Z", 86_400_000, true],
  ])("%s of its arrival is future: %s, off by %d ms: %s", (_, at, uncertaintyMs, isFuture) => {
    expect(placeEvent(event(at, { uncertaintyMs }), arrival)?.isFuture).toBe(isFuture);
  });

  test("a correction that would make something count in the future is future too", () => {
    const move = event(
      "2026-05-14T07:00:00Z",
      {},
      { kind: "move", event: id, to: "2026-05-15T07:00:00Z" },
    );
    expect(placeEvent(move, arrival)?.isFuture).toBe(true);
  });

  test("a clock that nothing explains places nothing", () => {
    const broken = { ...arrival, deviceMs: ms("9999-01-01T00:00:00Z") };
    expect(placeEvent(event("2026-05-14T07:00:00Z", { offsetMs: null }), broken)).toBeNull();
    const early = { ...arrival, deviceMs: ms("0001-01-01T00:00:00Z") };
    expect(placeEvent(event("9999-05-14T07:00:00Z", { offsetMs: null }), early)).toBeNull();
  });

  test("an offset that leads nowhere leaves no raw reading but the instant itself", () => {
    const placed = placeEvent(event(received, { offsetMs: Number.MAX_SAFE_INTEGER }), arrival);
    expect(placed).toMatchObject({ atMs: ms(received), rawMs: ms(received) });
  });
});

describe("effectMs", () => {
  test.each([
    [{ kind: "shift-start" }, null],
    [{ kind: "move", event: id, to: "2026-05-14T07:00:00Z" }, ms("2026-05-14T07:00:00Z")],
    [{ kind: "insert", event: event("2026-05-13T07:00:00Z") }, ms("2026-05-13T07:00:00Z")],
    [
      { kind: "settle", end: `no-shift-end:${id}`, answer: "end-at:2026-05-13T16:00:00Z" },
      ms("2026-05-13T16:00:00Z"),
    ],
    [{ kind: "settle", end: `rest-short:${id}`, answer: "accept" }, null],
    [{ kind: "settle", end: `no-shift-end:${id}`, answer: "end-at:0001-01-01T00:00:00Z" }, null],
  ])("%j takes effect at %s", (body, at) => {
    expect(effectMs(event(received, {}, body))).toBe(at);
  });
});
