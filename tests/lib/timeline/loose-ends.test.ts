import { describe } from "vitest";
import { plays } from "@/tests/say/plays";

describe("gatherEnds", () => {
  plays({
    "an objection waits for the lead, and can be taken back": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana count A 3 #count
      10:00 ana object count #wrong
      10:05 ana object other #slip
      10:05:05 ana undo #slip
      11:00 ana shift-end
      = ana 08:00 11:00 run A
      + ana 09:00 A 3 0 0
      ? ana objection #wrong`,
    "the lead's answer settles it": `
      08:00 ana shift-start
      10:00 ana object count #wrong
      11:00 ana shift-end
      12:00 ana settle objection #wrong accept by 7
      = ana 08:00 11:00 unassigned
      ? ana objection #wrong (settled)`,
    "what booking asked is asked on": `
      08:00 ana shift-start asks clock-unmeasured #in
      08:00 ana run A asks session-late #a
      09:00 ana shift-end
      = ana 08:00 09:00 run A
      ? ana clock-unmeasured #in
      ? ana session-late #a`,
    "what is taken back asks nothing any more": `
      08:00 ana shift-start
      08:00 ana run A asks session-late #a
      08:00:05 ana undo #a
      09:00 ana shift-end
      = ana 08:00 09:00 unassigned`,
    "a correction may ask too": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:00:05 ana undo #a asks session-late #undo
      09:00 ana shift-end
      = ana 08:00 09:00 unassigned
      ? ana session-late #undo`,
  });
});
