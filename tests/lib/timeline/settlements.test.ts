import { describe, expect, test } from "vitest";
import { endKey, settlementsOf } from "@/lib/timeline/settlements";
import { eventId, makeEvent } from "@/tests/make/events";
import { plays } from "@/tests/say/plays";

describe("endKey", () => {
  test("is the code and what the loose end hangs on", () => {
    expect(endKey("no-shift-end", eventId(7))).toBe(
      "no-shift-end:00000000-0000-4000-8000-000000000007",
    );
  });
});

describe("settlementsOf", () => {
  test("the last answer counts", () => {
    const end = endKey("break-long", eventId(1));
    const answers = ["leave", "accept"].map((answer, index) =>
      makeEvent(index + 2, index * 1000, { kind: "settle", end, answer }),
    );
    expect(settlementsOf(answers).get(end)).toEqual({ answer: "accept", event: answers[1] });
  });
});

describe("withToldEnds", () => {
  plays({
    "an end that is told ends the shift there, and the work ran until then": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      Tue 08:10 ana settle no-shift-end #in end-at 17:00
      = ana 08:00 17:00 run A
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in (settled)`,
    "it can be told before the limit is past": `
      08:00 ana shift-start #in
      08:00 ana run A
      18:00 ana settle no-shift-end #in end-at 17:00
      = ana 08:00 17:00 run A
      ? ana no-shift-end #in (settled)`,
    "an end that is told of a shift with an end of its own changes nothing": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:50 ana run B
      16:00 ana shift-end
      Tue 08:00 ana settle no-shift-end #in end-at 15:30
      = ana 08:00 15:50 run A
      = ana 15:50 16:00 run B`,
    "a tap after the told end is a shift of its own, and asks": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:50 ana run B #b
      Tue 08:00 ana settle no-shift-end #in end-at 15:30
      = ana 08:00 15:30 run A
      ? ana no-shift-end #in (settled)
      ? ana implied-start #b
      ? ana rest-short #b
      ? ana no-shift-end #b`,
    "an own end that comes in late is believed rather than the told one": `
      08:00 ana shift-start #in
      08:00 ana run A
      16:10 ana shift-end offline
      Tue 08:00 ana settle no-shift-end #in end-at 16:00
      = ana 08:00 16:10 run A`,
    "an end of the next day is another one": `
      08:00 ana shift-start #in
      08:00 ana run A
      Tue 08:00 ana settle no-shift-end #in end-at 16:00
      Tue 16:00 ana shift-end #end
      = ana 08:00 16:00 run A
      ? ana no-shift-end #in (settled)
      ? ana implied-start #end`,
    "an end in the future of its answer settles, and moves nothing": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      15:30 ana settle no-shift-end #in end-at 16:30
      asof Tue 08:00
      = ana 08:00 15:00 run A
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in (settled)`,
    "an end before the shift moves nothing": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      Tue 08:00 ana settle no-shift-end #in end-at 07:00
      = ana 08:00 15:00 run A
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in (settled)`,
    "an end more than 36 hours later moves nothing": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      Wed 08:00 ana settle no-shift-end #in end-at Tue 20:00:01
      = ana 08:00 15:00 run A
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in (settled)`,
    "a told end past the limit asks about the length": `
      08:00 ana shift-start #in
      08:00 ana run A
      Tue 08:00 ana settle no-shift-end #in end-at 23:00
      = ana 08:00 23:00 run A
      ? ana no-shift-end #in (settled)
      ? ana shift-long #in`,
    "accepting keeps the planned end and what is unassigned": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      Tue 08:10 ana settle no-shift-end #in accept
      = ana 08:00 15:00 run A
      = ana 15:00 16:30 unassigned
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in (settled)`,
    "leaving it settles as well": `
      08:00 ana shift-start #in
      15:00 ana run A
      Tue 08:10 ana settle no-shift-end #in leave
      = ana 08:00 15:00 unassigned
      ? ana no-shift-end #in (settled)`,
    "a shift with an implied start can be ended too": `
      08:05 ana run A #a
      Tue 08:10 ana settle no-shift-end #a end-at 16:00
      Tue 08:10 ana settle implied-start #a accept
      = ana 08:05 16:00 run A
      ? ana implied-start #a (settled)
      ? ana no-shift-end #a (settled)`,
    "the last answer counts, and one that is voided does not": `
      08:00 ana shift-start #in
      08:00 ana run A
      Tue 08:00 ana settle no-shift-end #in end-at 16:00
      Tue 08:10 ana settle no-shift-end #in end-at 17:00
      Tue 08:20 ana settle no-shift-end #in end-at 18:00 #third
      Tue 08:21 ana void #third
      = ana 08:00 17:00 run A
      ? ana no-shift-end #in (settled)`,
    "an answer to another question settles that one only": `
      08:00 ana shift-start #in
      10:00 ana rest #rest
      11:00 ana break-end
      12:00 ana rest #later
      13:00 ana break-end
      14:00 ana shift-end
      14:10 ana settle break-long #rest leave
      = ana 08:00 10:00 unassigned
      = ana 10:00 11:00 rest
      = ana 11:00 12:00 unassigned
      = ana 12:00 13:00 rest
      = ana 13:00 14:00 unassigned
      ? ana break-long #rest (settled)
      ? ana break-long #later`,
  });
});
