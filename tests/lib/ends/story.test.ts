import { describe, expect, test } from "vitest";
import { type StoryFacts, storyOf } from "@/lib/ends/story";

const at = (time: string) => Date.parse(`2026-05-06T${time}:00Z`);

function facts(other: Partial<StoryFacts> = {}): StoryFacts {
  return {
    code: "two-kiosks",
    atMs: at("09:00"),
    eventMs: at("09:00"),
    receivedMs: at("09:00"),
    body: { kind: "indirect", code: "tool-care" },
    kiosk: "Spray east",
    by: null,
    ticket: null,
    shift: { startMs: at("06:00"), endMs: at("14:30"), provisional: true },
    planned: { startMs: at("06:00"), endMs: at("14:30") },
    ...other,
  };
}

describe("storyOf", () => {
  test("a forgotten end: the last tap, the plan, and where the time stands", () => {
    expect(storyOf(facts({ code: "no-shift-end", atMs: at("12:12") }), "UTC")).toEqual([
      "The last tap was at 12:12.",
      "Planned 06:00 to 14:30.",
      "The time stands to 14:30 until then.",
    ]);
  });
  test("a record: what, when, where and by whom", () => {
    expect(storyOf(facts({ by: "Ada Berg", receivedMs: at("10:30") }), "UTC")[0]).toBe(
      "Tool care at 09:00, on Spray east, entered by Ada Berg, handed in at 10:30.",
    );
    expect(storyOf(facts({ ticket: "26048176" }), "UTC")[1]).toBe("It is about 26-04817-6.");
  });
  test("a record that cannot be read has only its coming", () => {
    const unread = facts({ code: "unreadable", body: null, shift: null, planned: null });
    expect(storyOf(unread, "UTC")).toEqual([
      "It came at 09:00 from Spray east.",
      "Nothing was planned.",
    ]);
  });
  test("a shift that runs has no end", () => {
    const runs = facts({ shift: { startMs: at("06:00"), endMs: null, provisional: false } });
    expect(storyOf(runs, "UTC")).toContain("The shift ran from 06:00 and runs.");
  });
});
