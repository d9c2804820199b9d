import { describe } from "vitest";
import { plays } from "@/tests/say/plays";

describe("walk: shifts", () => {
  plays({
    "shifts stand apart": `
      08:00 ana shift-start
      16:00 ana shift-end
      Tue 08:00 ana shift-start
      Tue 16:00 ana shift-end
      = ana 08:00 16:00 unassigned
      = ana Tue 08:00 Tue 16:00 unassigned`,
    "a shift over midnight is one": `
      22:00 ana shift-start
      22:00 ana run A
      Tue 06:00 ana shift-end
      = ana 22:00 Tue 06:00 run A`,
    "a new shift begins with nothing booked": `
      08:00 ana shift-start
      08:00 ana run A
      16:00 ana shift-end
      Tue 08:00 ana shift-start
      = ana 08:00 16:00 run A
      = ana Tue 08:00 ... unassigned`,
    "a start inside a shift changes nothing, and asks": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana shift-start #again
      16:00 ana shift-end
      = ana 08:00 16:00 run A
      ? ana already-in #again`,
    "from a kiosk that was offline it asks nobody": `
      08:00 ana shift-start
      09:00 ana shift-start @west offline #again
      16:00 ana shift-end
      = ana 08:00 16:00 unassigned
      ? ana already-in #again (settled)`,
    "nor does one that still waits in the kiosk": `
      08:00 ana shift-start
      09:00 ana shift-start waiting #again
      16:00 ana shift-end
      = ana 08:00 16:00 unassigned
      ? ana already-in #again (settled)`,
    "a start in a break leaves the break": `
      08:00 ana shift-start
      12:00 ana meal
      12:10 ana shift-start #again
      12:30 ana break-end
      16:00 ana shift-end
      = ana 08:00 12:00 unassigned
      = ana 12:00 12:30 meal
      = ana 12:30 16:00 unassigned
      ? ana already-in #again`,
    "a shift of less than a second is none": `
      08:00:00.100 ana shift-start
      08:00:00.900 ana shift-end`,
  });
});

describe("walk: a start that is missing", () => {
  plays({
    "work without a shift starts one, and asks": `
      08:05 ana run A #a
      16:00 ana shift-end
      = ana 08:05 16:00 run A
      ? ana implied-start #a`,
    "so do other work and breaks": `
      08:05 ana other cleaning #a
      09:00 ana shift-end
      Tue 08:05 ana rest #b
      Tue 08:15 ana break-end
      Tue 09:00 ana shift-end
      Wed 08:05 ana break-end #c
      Wed 09:00 ana shift-end
      = ana 08:05 09:00 other cleaning
      = ana Tue 08:05 Tue 08:15 rest
      = ana Tue 08:15 Tue 09:00 unassigned
      = ana Wed 08:05 Wed 09:00 unassigned
      ? ana implied-start #a
      ? ana implied-start #b
      ? ana implied-start #c`,
    "so does a count at the bench": `
      08:05 ana done A 1 #a
      16:00 ana shift-end
      = ana 08:05 16:00 unassigned
      + ana 08:05 A 1 0 0
      ? ana implied-start #a`,
    "a count that a lead enters says nothing of when the worker was there": `
      08:05 ana done A 1 by 7
      + ana 08:05 A 1 0 0`,
    "nor do a caution, a reading, an objection, a confirmation": `
      08:05 ana caution-read 120
      08:06 ana reading A
      08:07 ana confirm A
      08:08 ana release A`,
    "what is said to have begun before an implied start counts from the tap": `
      08:05 ana run A since 07:50 #a
      16:00 ana shift-end
      = ana 08:05 16:00 run A
      ? ana implied-start #a
      ? ana since-outside #a`,
    "an end without a shift asks for the start": `
      16:00 ana shift-end #end
      ? ana implied-start #end`,
    "an end that was tapped twice asks nothing": `
      08:00 ana shift-start
      16:00 ana shift-end
      16:00:05 ana shift-end @west
      = ana 08:00 16:00 unassigned`,
    "an end on the next day is another one": `
      08:00 ana shift-start
      16:00 ana shift-end
      Tue 16:00 ana shift-end #end
      Tue 16:01 ana shift-end
      = ana 08:00 16:00 unassigned
      ? ana implied-start #end`,
  });
});

describe("walk: an end that is missing", () => {
  plays({
    "up to the limit a shift runs on": `
      08:00 ana shift-start #in
      08:00 ana run A
      asof 22:00
      = ana 08:00 ... run A`,
    "past the limit it ends at the last tap, and asks": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      asof 22:00:01
      = ana 08:00 15:00 run A
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in`,
    "with a plan it ends at the planned end, unassigned after the last tap": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      asof Tue 00:00
      = ana 08:00 15:00 run A
      = ana 15:00 16:30 unassigned
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in`,
    "a last tap after the planned end is the end": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      08:00 ana run A
      17:10 ana count A 1
      asof Tue 00:00
      = ana 08:00 17:10 run A
      + ana 17:10 A 1 0 0
      ? ana no-shift-end #in`,
    "the next start ends it too, before the clock does": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      08:00 ana run A
      Tue 08:00 ana shift-start
      Tue 16:00 ana shift-end
      asof Tue 16:00
      = ana 08:00 16:30 unassigned
      = ana Tue 08:00 Tue 16:00 unassigned
      ? ana no-shift-end #in`,
    "an act after a night's rest belongs to a new shift": `
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      Tue 07:55 ana run B #b
      Tue 16:00 ana shift-end
      = ana 08:00 15:00 run A
      = ana Tue 07:55 Tue 16:00 run B
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in
      ? ana implied-start #b`,
    "an end after a night's rest is not the end of that shift": `
      08:00 ana shift-start #in
      15:00 ana run A
      Tue 16:00 ana shift-end #end
      = ana 08:00 15:00 unassigned
      ? ana no-shift-end #in
      ? ana implied-start #end`,
    "the planned end is never later than the next shift's start": `
      plan ana 08:00 21:55
      rules shiftLimitSeconds 36000
      08:00 ana shift-start #in
      18:00:01 ana shift-start
      19:00 ana shift-end
      = ana 08:00 18:00 unassigned
      = ana 18:00:01 19:00 unassigned
      ? ana no-shift-end #in`,
    "a plan reaches no further than the limit": `
      plan ana 08:00 23:30
      08:00 ana shift-start #in
      08:10 ana run A
      asof Tue 08:00
      = ana 08:00 08:10 unassigned
      = ana 08:10 22:00 unassigned
      ? ana no-shift-end #in`,
    "a plan of another day is no plan": `
      plan ana Tue 08:00 Tue 16:30
      08:00 ana shift-start #in
      15:00 ana run A
      asof Tue 08:00
      = ana 08:00 15:00 unassigned
      ? ana no-shift-end #in`,
    "of two plans the one that begins nearer holds": `
      plan ana 06:00 14:00
      plan ana 14:00 20:00
      13:40 ana shift-start #in
      13:45 ana run A
      asof Tue 08:00
      = ana 13:40 13:45 unassigned
      = ana 13:45 20:00 unassigned
      ? ana no-shift-end #in`,
    "a break that nobody ended asks, and is not a break after the last tap": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      12:00 ana meal #meal
      asof Tue 08:00
      = ana 08:00 12:00 unassigned
      = ana 12:00 16:30 unassigned
      ? ana no-shift-end #in
      ? ana break-open #meal`,
    "one single tap without a plan is no attendance, and asks": `
      08:00 ana shift-start #in
      asof Tue 08:00
      ? ana no-shift-end #in`,
    "what a lead enters after the worker left moves no end": `
      plan ana 08:00 16:30
      08:00 ana shift-start #in
      08:00 ana run A
      15:00 ana count A 1
      18:00 ana done A 1 by 7
      asof Tue 08:00
      = ana 08:00 15:00 run A
      = ana 15:00 16:30 unassigned
      + ana 15:00 A 1 0 0
      + ana 18:00 A 1 0 0
      ? ana no-shift-end #in`,
  });
});

describe("walk: shifts that are long, rests that are short", () => {
  plays({
    "a shift of the limit asks nothing": `
      08:00 ana shift-start
      22:00 ana shift-end
      = ana 08:00 22:00 unassigned`,
    "one that was ended later asks": `
      08:00 ana shift-start #in
      21:00 ana run A
      22:00:01 ana shift-end
      = ana 08:00 21:00 unassigned
      = ana 21:00 22:00:01 run A
      ? ana shift-long #in`,
    "taps that follow each other carry it over the limit": `
      08:00 ana shift-start #in
      21:30 ana run A
      22:30 ana run B
      23:00 ana shift-end
      = ana 08:00 21:30 unassigned
      = ana 21:30 22:30 run A
      = ana 22:30 23:00 run B
      ? ana shift-long #in`,
    "while they do, it is not forgotten": `
      08:00 ana shift-start #in
      21:30 ana run A
      22:30 ana run B
      asof Tue 09:29:59
      = ana 08:00 21:30 unassigned
      = ana 21:30 22:30 run A
      = ana 22:30 ... run B`,
    "once they stopped for a rest, it is": `
      08:00 ana shift-start #in
      21:30 ana run A
      22:30 ana run B
      asof Tue 09:30
      = ana 08:00 21:30 unassigned
      = ana 21:30 22:30 run A
      ? ana no-shift-end #in
      ? ana shift-long #in`,
    "past the limit a tap within the rest goes on, one after a full rest does not": `
      08:00 ana shift-start #in
      12:00 ana run A
      22:59:59 ana run B
      23:30 ana shift-end
      Wed 08:00 ana shift-start #late
      Wed 12:00 ana run A
      Wed 23:00 ana run B #b
      Wed 23:30 ana shift-end
      = ana 08:00 12:00 unassigned
      = ana 12:00 22:59:59 run A
      = ana 22:59:59 23:30 run B
      = ana Wed 08:00 Wed 12:00 unassigned
      = ana Wed 23:00 Wed 23:30 run B
      ? ana shift-long #in
      ? ana no-shift-end #late
      ? ana implied-start #b`,
    "no shift is longer than 36 hours": `
      08:00 ana shift-start #in
      17:00 ana run A
      Tue 02:00 ana run B
      Tue 11:00 ana run C
      Tue 20:00 ana run D
      Tue 20:00:01 ana run E #e
      Tue 21:00 ana shift-end
      = ana 08:00 17:00 unassigned
      = ana 17:00 Tue 02:00 run A
      = ana Tue 02:00 Tue 11:00 run B
      = ana Tue 11:00 Tue 20:00 run C
      = ana Tue 20:00:01 Tue 21:00 run E
      ? ana no-shift-end #in
      ? ana shift-long #in
      ? ana implied-start #e`,
    "a start past the limit is a new shift, however short the rest": `
      08:00 ana shift-start #in
      21:50 ana run A
      22:30 ana shift-start
      23:00 ana shift-end
      = ana 08:00 21:50 unassigned
      = ana 22:30 23:00 unassigned
      ? ana no-shift-end #in`,
    "less rest than the site allows asks, the least allowed does not": `
      08:00 ana shift-start
      20:00 ana shift-end
      Tue 06:59:59 ana shift-start #early
      Tue 16:00 ana shift-end
      Wed 03:00 ana shift-start
      Wed 08:00 ana shift-end
      = ana 08:00 20:00 unassigned
      = ana Tue 06:59:59 Tue 16:00 unassigned
      = ana Wed 03:00 Wed 08:00 unassigned
      ? ana rest-short #early`,
    "an implied start may come after a short rest too": `
      08:00 ana shift-start
      16:00 ana shift-end
      18:00 ana run A #a
      19:00 ana shift-end
      = ana 08:00 16:00 unassigned
      = ana 18:00 19:00 run A
      ? ana implied-start #a
      ? ana rest-short #a`,
    "nor from an end that came before such a shift": `
      rules shiftLimitSeconds 7200
      08:00 ana shift-start
      09:00 ana shift-end
      09:30 ana shift-start #in
      12:00 ana shift-start
      13:00 ana shift-end
      = ana 08:00 09:00 unassigned
      = ana 12:00 13:00 unassigned
      ? ana rest-short #in
      ? ana no-shift-end #in`,
    "after an end that nobody tapped, no rest can be measured": `
      plan ana 08:00 21:00
      08:00 ana shift-start #in
      Tue 05:00 ana shift-start
      Tue 09:00 ana shift-end
      = ana 08:00 21:00 unassigned
      = ana Tue 05:00 Tue 09:00 unassigned
      ? ana no-shift-end #in`,
  });
});

describe("walk: cells", () => {
  plays({
    "an act is in its own cell, breaks and unassigned time in that of the act before": `
      cells
      08:00 ana shift-start @east
      08:10 ana run A @west
      10:00 ana rest @north
      10:10 ana break-end @east
      11:00 ana done A 1 @east
      11:10 ana run B @east
      11:20 ana done B 1
      12:00 ana shift-end @west
      = ana 08:00 08:10 unassigned in east
      = ana 08:10 10:00 run A in west
      = ana 10:00 10:10 rest in west
      = ana 10:10 11:00 run A in west
      = ana 11:00 11:10 unassigned in west
      = ana 11:10 11:20 run B in east
      = ana 11:20 12:00 unassigned in east
      + ana 11:00 A 1 0 0
      + ana 11:20 B 1 0 0`,
    "without a kiosk a shift begins in the home cell, and an act stays in the cell before": `
      cells
      08:00 ana shift-start @office
      08:10 ana run A @office
      09:00 ana run B @east
      10:00 ana run C @office
      11:00 ana shift-end
      = ana 08:00 08:10 unassigned in home
      = ana 08:10 09:00 run A in home
      = ana 09:00 10:00 run B in east
      = ana 10:00 11:00 run C in east`,
    "unassigned time after the last tap is in the cell of the last act": `
      cells
      plan ana 08:00 16:30
      08:00 ana shift-start @east #in
      09:00 ana run A @west
      15:00 ana count A 1 @east
      asof Tue 08:00
      = ana 08:00 09:00 unassigned in east
      = ana 09:00 15:00 run A in west
      = ana 15:00 16:30 unassigned in west
      + ana 15:00 A 1 0 0
      ? ana no-shift-end #in`,
  });
});
