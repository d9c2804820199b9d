import { describe, expect, test } from "vitest";
import {
  endGroups,
  endOpen,
  type ListedEnd,
  type OpenedEnd,
  positionOf,
  readKey,
} from "@/lib/ends/view";

const at = (time: string) => Date.parse(`2026-05-06T${time}:00Z`);

const listed: ListedEnd = {
  rank: 0,
  code: "no-shift-end",
  subject: "a",
  atMs: at("12:12"),
  ticket: null,
  worker: "1042",
  name: "Ilo Varn",
  cell: "Mill",
  kiosk: null,
};
const opened: OpenedEnd = {
  ...listed,
  receivedMs: at("06:00"),
  eventMs: at("06:00"),
  body: { kind: "shift-start" },
  by: null,
  note: null,
  shift: { startMs: at("06:00"), endMs: at("14:30"), provisional: true },
  planned: { startMs: at("06:00"), endMs: at("14:30") },
  stretches: [],
};

describe("endGroups", () => {
  test("heads each rank once, and says whose, when and what", () => {
    const groups = endGroups([listed, { ...listed, rank: 2, code: "rest-short" }], "UTC");
    expect(groups.map(({ heading }) => heading)).toEqual([
      "Somebody's time depends on it",
      "To be known",
    ]);
    expect(groups[0]?.lines).toMatchObject([
      { key: "no-shift-end:a", what: "no end tapped", when: "Wed 6 May, 12:12" },
    ]);
  });
  test("nothing to settle has no groups", () => expect(endGroups([], "UTC")).toEqual([]));
});

describe("endOpen", () => {
  test("begins the field at the planned end, never in the future", () => {
    const late = { timeZone: "UTC", nowMs: at("20:00") };
    expect(endOpen(opened, late)).toMatchObject({
      proposed: "2026-05-06T14:30",
      day: "2026-05-06",
      asksWorker: true,
    });
    expect(endOpen(opened, { timeZone: "UTC", nowMs: at("13:00") }).proposed).toBe(
      "2026-05-06T13:00",
    );
  });
  test("asks the worker only what only they can know", () => {
    const now = { timeZone: "UTC", nowMs: at("20:00") };
    expect(endOpen({ ...opened, code: "two-kiosks" }, now).asksWorker).toBe(false);
    expect(endOpen({ ...opened, worker: null }, now).asksWorker).toBe(false);
  });
  test("names the day on which a night shift began", () => {
    const night = { startMs: at("22:00") - 86_400_000, endMs: at("06:00"), provisional: false };
    const facts = { ...opened, atMs: at("02:00"), shift: night };
    expect(endOpen(facts, { timeZone: "UTC", nowMs: at("20:00") }).day).toBe("2026-05-05");
  });
});

describe("positionOf", () => {
  test("is where the list goes on", () => {
    expect(positionOf(listed)).toEqual([0, at("12:12"), "no-shift-end", "a"]);
  });
});

describe("readKey", () => {
  test("parts code and subject at the first colon", () => {
    expect(readKey("over-count:26000017/010:a")).toEqual({
      code: "over-count",
      subject: "26000017/010:a",
    });
    expect(readKey("")).toEqual({ code: "", subject: "" });
  });
});
