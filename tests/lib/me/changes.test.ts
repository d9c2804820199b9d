import { describe, expect, test } from "vitest";
import { type Change, changeLines } from "@/lib/me/changes";

const at = (time: string) => Date.parse(`2026-05-06T${time}:00Z`);

function change(kind: string, other: Partial<Change> = {}): Change {
  return {
    id: kind,
    kind,
    atMs: at("16:00"),
    countsMs: null,
    by: "Ada Berg",
    note: "asked at the bench",
    body: {},
    targetKind: "shift-start",
    targetBody: {},
    targetMs: at("06:00"),
    ...other,
  };
}
const words = (one: Change) => changeLines([one], "UTC")[0]?.what;

describe("changeLines", () => {
  test("says what, who, when and why", () => {
    expect(changeLines([change("void")], "UTC")).toEqual([
      {
        id: "void",
        what: "Took out shift started, Wed 6 May, 06:00",
        who: "Ada Berg, Wed 6 May, 16:00",
        why: "asked at the bench",
      },
    ]);
  });

  test.each([
    [
      change("move", { countsMs: at("05:50") }),
      "Moved shift started, Wed 6 May, 06:00, to Wed 6 May, 05:50",
    ],
    [
      change("insert", { countsMs: at("14:30"), body: { event: { kind: "shift-end" } } }),
      "Entered shift ended, Wed 6 May, 14:30",
    ],
    [
      change("settle", {
        body: { end: "no-shift-end:a", answer: "end-at:2026-05-06T14:30:00Z" },
      }),
      "Settled no end tapped: the shift ended Wed 6 May, 14:30",
    ],
    [
      change("settle", { body: { end: "over-count:a", answer: "accept" } }),
      "Settled more counted than there is",
    ],
    [change("void", { targetKind: null }), "Took out a record"],
    [change("indirect", { body: { code: "cleaning" } }), "Entered cleaning, Wed 6 May, 16:00"],
  ])("%#", (one, is) => expect(words(one)).toBe(is));

  test("an answer is told with the correction that it means, once", () => {
    const both = [
      change("settle", { body: { end: "two-kiosks:a", answer: "void" } }),
      change("void"),
    ];
    expect(changeLines(both, "UTC").map(({ id }) => id)).toEqual(["void"]);
    const later = [{ ...both[0]!, atMs: at("17:00") }, both[1]!];
    expect(changeLines(later, "UTC")).toHaveLength(2);
  });
});
