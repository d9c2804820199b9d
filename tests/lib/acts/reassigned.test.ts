import { describe } from "vitest";
import { plays } from "@/tests/say/plays";

describe("reassigned", () => {
  plays({
    "the current activity becomes something else from its beginning": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 10:00 run B`,
    "its counts follow when one item replaces one": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana count A 2
      09:00 ana done A 1
      09:10 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 09:00 run B
      = ana 09:00 10:00 unassigned
      + ana 08:30 B 2 0 0
      + ana 09:00 B 1 0 0`,
    "the last activity can be put right after the next has begun": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:40 ana done A 1
      08:50 ana run C
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 08:40 run B
      = ana 08:40 08:50 unassigned
      = ana 08:50 10:00 run C
      + ana 08:40 B 1 0 0`,
    "a count made after the next activity began follows too": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:50 ana run C
      08:55 ana count A 1
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 08:50 run B
      = ana 08:50 10:00 run C
      + ana 08:55 B 1 0 0`,
    "but not once the old ticket was taken up anew": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:50 ana run A
      08:55 ana done A 1
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 08:50 run B
      = ana 08:50 08:55 run A
      = ana 08:55 10:00 unassigned
      + ana 08:55 A 1 0 0`,
    "nor one that is made after the reassignment": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana reassign #a run B
      09:10 ana count A 1
      10:00 ana shift-end
      = ana 08:00 10:00 run B
      + ana 09:10 A 1 0 0`,
    "the one before the last is settled history": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana run B
      08:40 ana run C
      09:00 ana reassign #a run D #again
      10:00 ana shift-end
      = ana 08:00 08:30 run A
      = ana 08:30 08:40 run B
      = ana 08:40 10:00 run C
      ? ana objection #again`,
    "after the shift has ended a lead must look": `
      08:00 ana shift-start
      08:00 ana run A #a
      10:00 ana shift-end
      10:05 ana reassign #a run B #late
      = ana 08:00 10:00 run A
      ? ana objection #late`,
    "in the next shift too": `
      08:00 ana shift-start
      08:00 ana run A #a
      16:00 ana shift-end
      Tue 08:00 ana shift-start
      Tue 08:05 ana reassign #a run B #late
      Tue 16:00 ana shift-end
      = ana 08:00 16:00 run A
      = ana Tue 08:00 Tue 16:00 unassigned
      ? ana objection #late`,
    "in a batch one item replaces one, and the others stay": `
      08:00 ana shift-start
      08:00 ana run A B C #batch
      08:30 ana done B 1
      09:00 ana reassign #batch run A D C
      10:00 ana shift-end
      = ana 08:00 08:30 run A D C
      = ana 08:30 10:00 run A C
      + ana 08:30 D 1 0 0`,
    "two items for one leave the counts where they are, with a question": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana count A 1
      09:00 ana done A 1
      09:10 ana reassign #a run B C #many
      10:00 ana shift-end
      = ana 08:00 09:00 run B C
      = ana 09:00 10:00 unassigned
      + ana 08:30 A 1 0 0
      + ana 09:00 A 1 0 0
      ? ana objection #many`,
    "without counts there is no question": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana pause A
      09:10 ana reassign #a run B C
      10:00 ana shift-end
      = ana 08:00 09:00 run B C
      = ana 09:00 10:00 unassigned`,
    "one item for two leaves when the last of the two left": `
      08:00 ana shift-start
      08:00 ana run A B #two
      08:30 ana pause A
      09:00 ana pause B
      09:10 ana reassign #two run C
      10:00 ana shift-end
      = ana 08:00 09:00 run C
      = ana 09:00 10:00 unassigned`,
    "to other work: the end stays, the counts stay and ask": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana done A 1
      09:00 ana reassign #a other training #other
      10:00 ana shift-end
      = ana 08:00 08:30 other training
      = ana 08:30 10:00 unassigned
      + ana 08:30 A 1 0 0
      ? ana objection #other`,
    "from other work to a ticket": `
      08:00 ana shift-start
      08:00 ana other cleaning #other
      09:00 ana reassign #other setup A
      10:00 ana shift-end
      = ana 08:00 10:00 setup A`,
    "from other work without saying how it was worked on it is a run": `
      08:00 ana shift-start
      08:00 ana other cleaning #other
      09:00 ana reassign #other to A
      10:00 ana shift-end
      = ana 08:00 10:00 run A`,
    "the way of working stays if none is said": `
      08:00 ana shift-start
      08:00 ana setup A #a
      09:00 ana reassign #a to B
      10:00 ana shift-end
      = ana 08:00 10:00 setup B`,
    "only the way of working can change": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana count A 1
      09:00 ana reassign #a rework A
      10:00 ana shift-end
      = ana 08:00 10:00 rework A
      + ana 08:30 A 1 0 0`,
    "breaks inside it stay": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana rest
      08:40 ana break-end
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 08:30 run B
      = ana 08:30 08:40 rest
      = ana 08:40 10:00 run B`,
    "what was said of its beginning stays": `
      08:00 ana shift-start
      08:20 ana run A since 08:10 #a
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 08:10 unassigned
      = ana 08:10 10:00 run B (said)`,
    "of two reassignments the last in order wins": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana count A 1
      09:00 ana reassign #a run B
      09:10 ana reassign #a run C
      10:00 ana shift-end
      = ana 08:00 10:00 run C
      + ana 08:30 C 1 0 0`,
    "one that is undone leaves things as they were": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana reassign #a run B #slip
      09:00:05 ana undo #slip
      10:00 ana shift-end
      = ana 08:00 10:00 run A`,
    "of an act that was undone nothing is left to reassign, and nothing to ask": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:00:05 ana undo #a
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 10:00 unassigned`,
    "one that counts before its activity asks": `
      08:00 ana shift-start
      08:30 ana run A #a
      08:20 ana reassign #a run B #early
      10:00 ana shift-end
      = ana 08:00 08:30 unassigned
      = ana 08:30 10:00 run A
      ? ana objection #early`,
    "a later void wins": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana reassign #a run B
      10:00 ana shift-end
      12:00 ana void #a by 7
      = ana 08:00 10:00 unassigned`,
    "one that comes too late leaves an earlier one, and a void, in force": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana run X #x
      09:30 ana reassign #a run B
      10:00 ana shift-end
      10:05 ana reassign #a run C #late
      10:06 ana void #x by 7
      10:07 ana reassign #x run C #later
      = ana 08:00 10:00 run B
      ? ana objection #late
      ? ana objection #later`,
    "a later reassignment brings back what was voided": `
      08:00 ana shift-start
      08:00 ana run A #a
      08:30 ana void #a by 7
      09:00 ana reassign #a run B
      10:00 ana shift-end
      = ana 08:00 10:00 run B`,
    "a move of its time and a reassignment both hold": `
      08:00 ana shift-start
      08:10 ana run A #a
      09:00 ana reassign #a run B
      10:00 ana shift-end
      12:00 ana move #a 08:30 by 7
      = ana 08:00 08:30 unassigned
      = ana 08:30 10:00 run B`,
    "an act that is not known asks, and so does one that is no activity": `
      08:00 ana shift-start #in
      09:00 ana reassign #nothing run B #first
      09:10 ana reassign #in run B #second
      10:00 ana shift-end
      = ana 08:00 10:00 unassigned
      ? ana objection #first
      ? ana objection #second`,
    "saying nothing of what it was asks": `
      08:00 ana shift-start
      08:00 ana run A #a
      09:00 ana reassign #a #empty
      10:00 ana shift-end
      = ana 08:00 10:00 run A
      ? ana objection #empty`,
    "two activities in a row can both be put right": `
      08:00 ana shift-start
      08:00 ana run A #one
      08:30 ana run A B #two
      09:00 ana reassign #one run C
      09:01 ana reassign #two run C B
      10:00 ana shift-end
      = ana 08:00 08:30 run C
      = ana 08:30 10:00 run C B`,
  });
});

describe("reassigned: cells", () => {
  plays({
    "the activity goes to the cell that the new one belongs to": `
      cells
      08:00 ana shift-start @east
      08:00 ana run A @east #a
      09:00 ana reassign #a run B @west
      10:00 ana shift-end
      = ana 08:00 10:00 run B in west`,
    "it stays where it was if nobody says where the new one belongs": `
      cells
      08:00 ana shift-start @east
      08:00 ana run A @east #a
      09:00 ana reassign #a run B @office
      10:00 ana shift-end
      = ana 08:00 10:00 run B in east`,
  });
});
