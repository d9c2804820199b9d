import { describe } from "vitest";
import { plays } from "@/tests/say/plays";

describe("effectiveEvents: undo", () => {
  plays({
    "what is undone within ten seconds never was": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana run B #b
      09:00:10 ana undo #b
      10:00 ana shift-end
      = ana 08:00 10:00 run A`,
    "a count too": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana done A 1 #done
      09:00:03 ana undo #done
      10:00 ana shift-end
      = ana 08:00 10:00 run A`,
    "a shift's end too": `
      08:00 ana shift-start
      16:00 ana shift-end #end
      16:00:04 ana undo #end
      16:30 ana shift-end
      = ana 08:00 16:30 unassigned`,
    "later than ten seconds it is too late, and asks": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:00:10.001 ana undo #a #undo
      10:00 ana shift-end
      = ana 08:00 10:00 run A
      ? ana undo-late #undo`,
    "from another kiosk it does not hold": `
      08:00 ana shift-start
      08:00 ana run A @east #a
      08:00:05 ana undo #a @west #undo
      10:00 ana shift-end
      = ana 08:00 10:00 run A
      ? ana undo-late #undo`,
    "of an act that nobody knows it asks": `
      08:00 ana shift-start
      08:00:05 ana undo #nothing #undo
      10:00 ana shift-end
      = ana 08:00 10:00 unassigned
      ? ana undo-late #undo`,
    "a tablet's clock that was set back in between does no harm": `
      08:00 ana shift-start
      09:00:02 ana run A #a
      09:00 ana undo #a
      10:00 ana shift-end
      = ana 08:00 10:00 unassigned`,
    "an undo that is undone brings the act back": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:00:05 ana undo #a #undo
      08:00:09 ana undo #undo
      10:00 ana shift-end
      = ana 08:00 10:00 run A`,
    "an undo that is voided brings it back too": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:00:05 ana undo #a #undo
      12:00 ana void #undo by 7
      10:00 ana shift-end
      = ana 08:00 10:00 run A`,
    "what was undone is no sign that the worker was there": `
      08:00 ana shift-start #in
      15:00 ana run A
      16:00 ana run B #b
      16:00:05 ana undo #b
      asof Tue 08:00
      = ana 08:00 15:00 unassigned
      ? ana no-shift-end #in`,
  });
});

describe("effectiveEvents: void, move and insert", () => {
  plays({
    "what a lead voids vanishes": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana run B #b
      10:00 ana shift-end
      Wed 12:00 ana void #b by 7
      = ana 08:00 10:00 run A`,
    "a voided void gives it back": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana run B #b
      10:00 ana shift-end
      12:00 ana void #b by 7 #void
      12:01 ana void #void by 7
      = ana 08:00 09:00 run A
      = ana 09:00 10:00 run B`,
    "what is moved counts at its new time": `
      08:00 ana shift-start #in
      09:00 ana run A
      16:00 ana shift-end #out
      Tue 08:00 ana move #in 07:30 by 7
      Tue 08:01 ana move #out 16:45 by 7
      = ana 07:30 09:00 unassigned
      = ana 09:00 16:45 run A`,
    "a count moves with its time": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana done A 1 #done
      10:00 ana shift-end
      12:00 ana move #done 09:30 by 7
      = ana 08:00 09:30 run A
      = ana 09:30 10:00 unassigned
      + ana 09:30 A 1 0 0`,
    "a move can change the order": `
      08:00 ana shift-start
      08:10 ana run A
      08:20 ana run B #b
      09:00 ana shift-end
      12:00 ana move #b 08:05 by 7
      = ana 08:00 08:05 unassigned
      = ana 08:05 08:10 run B
      = ana 08:10 09:00 run A`,
    "of two moves the last in order holds": `
      08:00 ana shift-start #in
      16:00 ana shift-end
      Tue 08:05 ana move #in 07:00 by 7
      Tue 08:00 ana move #in 07:30 by 7
      = ana 07:00 16:00 unassigned`,
    "a void after a move wins": `
      08:00 ana shift-start
      09:00 ana run A #a
      16:00 ana shift-end
      Tue 08:00 ana move #a 10:00 by 7
      Tue 08:01 ana void #a by 7
      = ana 08:00 16:00 unassigned`,
    "a move that is voided moves nothing": `
      08:00 ana shift-start
      09:00 ana run A #a
      16:00 ana shift-end
      Tue 08:00 ana move #a 10:00 by 7 #move
      Tue 08:01 ana void #move by 7
      = ana 08:00 09:00 unassigned
      = ana 09:00 16:00 run A`,
    "what brings a voided act back brings back no earlier move": `
      08:00 ana shift-start
      09:00 ana run A #a
      10:00 ana move #a 09:30 by 7
      10:01 ana void #a by 7
      10:02 ana reassign #a run B
      16:00 ana shift-end
      = ana 08:00 09:00 unassigned
      = ana 09:00 16:00 run B`,
    "a move after a void wins": `
      08:00 ana shift-start
      09:00 ana run A #a
      16:00 ana shift-end
      Tue 08:00 ana void #a by 7
      Tue 08:01 ana move #a 10:00 by 7
      = ana 08:00 10:00 unassigned
      = ana 10:00 16:00 run A`,
    "a move before a void is gone with it": `
      08:00 ana shift-start
      09:00 ana run A #a
      16:00 ana shift-end
      Tue 08:00 ana move #a 10:00 by 7
      Tue 08:01 ana void #a by 7
      Tue 08:02 ana move #a 11:00 by 7 #back
      Tue 08:03 ana void #back by 7
      = ana 08:00 16:00 unassigned`,
    "an inserted act counts at its own time": `
      08:00 ana shift-start
      12:00 ana run B
      16:00 ana shift-end
      Tue 08:00 ana insert 09:00 run A by 7
      = ana 08:00 09:00 unassigned
      = ana 09:00 12:00 run A
      = ana 12:00 16:00 run B`,
    "an inserted end closes a shift": `
      08:00 ana shift-start
      09:00 ana run A
      Tue 08:00 ana insert 16:30 shift-end by 7
      = ana 08:00 09:00 unassigned
      = ana 09:00 16:30 run A`,
    "an inserted act can be moved and voided": `
      08:00 ana shift-start
      16:00 ana shift-end
      Tue 08:00 ana insert 09:00 run A by 7 #a
      Tue 08:01 ana insert 10:00 run B by 7 #b
      Tue 08:02 ana move #a 09:30 by 7
      Tue 08:03 ana void #b by 7
      = ana 08:00 09:30 unassigned
      = ana 09:30 16:00 run A`,
    "an inserted count counts": `
      08:00 ana shift-start
      16:00 ana shift-end
      Tue 08:00 ana insert 09:00 count A 2 by 7
      = ana 08:00 16:00 unassigned
      + ana 09:00 A 2 0 0`,
    "a correction of an act that is not known does nothing": `
      08:00 ana shift-start
      16:00 ana shift-end
      Tue 08:00 ana void #nothing by 7
      Tue 08:00 ana move #nothing 09:00 by 7
      = ana 08:00 16:00 unassigned`,
    "a correction cannot be inserted": `
      08:00 ana shift-start
      09:00 ana run A #a
      16:00 ana shift-end
      Tue 08:00 ana insert 09:30 void #a by 7
      = ana 08:00 09:00 unassigned
      = ana 09:00 16:00 run A`,
  });
});
