import { describe } from "vitest";
import { plays } from "@/tests/say/plays";

describe("takeEffect: work and other work", () => {
  plays({
    "attended time with nothing booked is unassigned": `
      08:00 ana shift-start
      16:00 ana shift-end
      = ana 08:00 16:00 unassigned`,
    "work replaces work, and other work replaces it too": `
      08:00 ana shift-start
      08:05 ana setup A
      08:30 ana run A
      09:00 ana run B
      09:30 ana other cleaning
      10:00 ana run B
      16:00 ana shift-end
      = ana 08:00 08:05 unassigned
      = ana 08:05 08:30 setup A
      = ana 08:30 09:00 run A
      = ana 09:00 09:30 run B
      = ana 09:30 10:00 other cleaning
      = ana 10:00 16:00 run B`,
    "an instant is cut to its second": `
      08:00:00.999 ana shift-start
      08:00:01.001 ana run A
      08:00:02.500 ana shift-end
      = ana 08:00 08:00:01 unassigned
      = ana 08:00:01 08:00:02 run A`,
    "what lasts less than a second leaves no segment": `
      08:00:00.100 ana shift-start
      08:00:00.500 ana run A
      08:00:00.900 ana run B
      09:00 ana shift-end
      = ana 08:00 09:00 run B`,
    "several tickets at once are one interval, with the weights that were booked": `
      08:00 ana shift-start
      08:00 ana run A*600 B*300
      09:00 ana shift-end
      = ana 08:00 09:00 run A*600 B*300`,
    "an item that is named twice counts once": `
      08:00 ana shift-start
      08:00 ana run A*600 B A*5
      09:00 ana shift-end
      = ana 08:00 09:00 run A*600 B`,
    "two operations of one ticket are two items": `
      08:00 ana shift-start
      08:00 ana run A/110 A/130
      08:30 ana pause A/110
      09:00 ana shift-end
      = ana 08:00 08:30 run A/110 A/130
      = ana 08:30 09:00 run A/130`,
    "what runs has no end": `
      08:00 ana shift-start
      08:05 ana inspecting A
      = ana 08:00 08:05 unassigned
      = ana 08:05 ... inspecting A`,
    "readings, cautions, steps, confirmations and releases take no time": `
      08:00 ana shift-start
      08:00 ana run A
      08:10 ana reading A
      08:11 ana caution-read 120
      08:12 ana step-done A glue
      08:13 ana confirm A
      08:14 ana release A
      09:00 ana shift-end
      = ana 08:00 09:00 run A`,
  });
});

describe("takeEffect: counts, pauses and hand-overs", () => {
  plays({
    "a count lets the work run on": `
      08:00 ana shift-start
      08:00 ana run A
      08:30 ana count A 2 1 1
      09:00 ana shift-end
      = ana 08:00 09:00 run A
      + ana 08:30 A 2 1 1`,
    "done takes the item out from that second, and none left is unassigned": `
      08:00 ana shift-start
      08:00 ana run A B
      08:30 ana done A 1
      08:40 ana done B 1
      09:00 ana shift-end
      = ana 08:00 08:30 run A B
      = ana 08:30 08:40 run B
      = ana 08:40 09:00 unassigned
      + ana 08:30 A 1 0 0
      + ana 08:40 B 1 0 0`,
    "done for work one is not on counts and changes nothing": `
      08:00 ana shift-start
      08:00 ana run A
      08:30 ana done B 1
      09:00 ana shift-end
      = ana 08:00 09:00 run A
      + ana 08:30 B 1 0 0`,
    "done at another operation of the ticket changes nothing": `
      08:00 ana shift-start
      08:00 ana run A
      08:30 ana done A/130 1
      09:00 ana shift-end
      = ana 08:00 09:00 run A
      + ana 08:30 A/130 1 0 0`,
    "done while on other work leaves the other work alone": `
      08:00 ana shift-start
      08:00 ana run A
      08:20 ana other meeting
      08:30 ana done A 1
      09:00 ana shift-end
      = ana 08:00 08:20 run A
      = ana 08:20 09:00 other meeting
      + ana 08:30 A 1 0 0`,
    "a pause takes its items out together": `
      08:00 ana shift-start
      08:00 ana run A B C
      08:30 ana pause A C
      08:40 ana pause B
      09:00 ana shift-end
      = ana 08:00 08:30 run A B C
      = ana 08:30 08:40 run B
      = ana 08:40 09:00 unassigned`,
    "a hand-over takes its item out": `
      08:00 ana shift-start
      08:00 ana run A B
      08:30 ana hand-over A ben
      09:00 ana shift-end
      = ana 08:00 08:30 run A B
      = ana 08:30 09:00 run B`,
    "an inspection counts and lets the inspecting run on": `
      08:00 ana shift-start
      08:00 ana inspecting A
      08:30 ana inspect A 1 1 0
      09:00 ana shift-end
      = ana 08:00 09:00 inspecting A
      + ana 08:30 A 1 1 0`,
    "a count outside any shift is kept": `
      08:00 ana shift-start
      09:00 ana shift-end
      10:00 ana count A 1 by 7
      = ana 08:00 09:00 unassigned
      + ana 10:00 A 1 0 0`,
  });
});

describe("takeEffect: breaks", () => {
  plays({
    "a break resumes what it interrupted": `
      08:00 ana shift-start
      08:00 ana run A*600 B*300
      10:00 ana rest
      10:15 ana break-end
      12:00 ana meal
      12:30 ana break-end
      16:00 ana shift-end
      = ana 08:00 10:00 run A*600 B*300
      = ana 10:00 10:15 rest
      = ana 10:15 12:00 run A*600 B*300
      = ana 12:00 12:30 meal
      = ana 12:30 16:00 run A*600 B*300`,
    "a break from nothing goes back to nothing": `
      08:00 ana shift-start
      10:00 ana rest
      10:15 ana break-end
      16:00 ana shift-end
      = ana 08:00 10:00 unassigned
      = ana 10:00 10:15 rest
      = ana 10:15 16:00 unassigned`,
    "a work tap ends a break, and so does other work": `
      08:00 ana shift-start
      08:00 ana run A
      10:00 ana rest
      10:10 ana run B
      12:00 ana meal
      12:30 ana other cleaning
      16:00 ana shift-end
      = ana 08:00 10:00 run A
      = ana 10:00 10:10 rest
      = ana 10:10 12:00 run B
      = ana 12:00 12:30 meal
      = ana 12:30 16:00 other cleaning`,
    "the end of the shift ends a break": `
      08:00 ana shift-start
      15:45 ana rest
      16:00 ana shift-end
      = ana 08:00 15:45 unassigned
      = ana 15:45 16:00 rest`,
    "done in a break leaves the break alone and the work without the item": `
      08:00 ana shift-start
      08:00 ana run A B
      10:00 ana rest
      10:05 ana done A 1
      10:10 ana break-end
      10:20 ana rest
      10:25 ana done B 1
      10:30 ana break-end
      11:00 ana shift-end
      = ana 08:00 10:00 run A B
      = ana 10:00 10:10 rest
      = ana 10:10 10:20 run B
      = ana 10:20 10:30 rest
      = ana 10:30 11:00 unassigned
      + ana 10:05 A 1 0 0
      + ana 10:25 B 1 0 0`,
    "a break that becomes one of the other kind interrupts the same work": `
      08:00 ana shift-start
      08:00 ana run A
      12:00 ana rest
      12:10 ana meal
      12:40 ana break-end
      16:00 ana shift-end
      = ana 08:00 12:00 run A
      = ana 12:00 12:10 rest
      = ana 12:10 12:40 meal
      = ana 12:40 16:00 run A`,
    "a break that is started twice began once": `
      08:00 ana shift-start
      12:00 ana meal
      12:01 ana meal
      12:30 ana break-end
      16:00 ana shift-end
      = ana 08:00 12:00 unassigned
      = ana 12:00 12:30 meal
      = ana 12:30 16:00 unassigned`,
    "a break's end without a break changes nothing": `
      08:00 ana shift-start
      08:00 ana run A
      10:15 ana break-end
      16:00 ana shift-end
      = ana 08:00 16:00 run A`,
    "a break of the greatest length asks nothing, a second more asks": `
      08:00 ana shift-start
      10:00 ana rest
      10:20 ana break-end
      11:00 ana rest #rest
      11:20:01 ana break-end
      12:00 ana meal
      13:15 ana break-end
      14:00 ana meal #meal
      15:15:01 ana run A
      16:00 ana shift-end
      = ana 08:00 10:00 unassigned
      = ana 10:00 10:20 rest
      = ana 10:20 11:00 unassigned
      = ana 11:00 11:20:01 rest
      = ana 11:20:01 12:00 unassigned
      = ana 12:00 13:15 meal
      = ana 13:15 14:00 unassigned
      = ana 14:00 15:15:01 meal
      = ana 15:15:01 16:00 run A
      ? ana break-long #rest
      ? ana break-long #meal`,
    "a meal that lasts until the shift's end asks too": `
      08:00 ana shift-start
      12:00 ana meal #meal
      16:00 ana shift-end
      = ana 08:00 12:00 unassigned
      = ana 12:00 16:00 meal
      ? ana break-long #meal`,
    "a rest that turns into a meal is measured alone": `
      08:00 ana shift-start
      12:00 ana rest #rest
      12:30 ana meal
      13:30 ana break-end
      16:00 ana shift-end
      = ana 08:00 12:00 unassigned
      = ana 12:00 12:30 rest
      = ana 12:30 13:30 meal
      = ana 13:30 16:00 unassigned
      ? ana break-long #rest`,
    "a break that still runs asks nothing yet": `
      08:00 ana shift-start
      09:00 ana rest
      11:00 ana count A 1
      = ana 08:00 09:00 unassigned
      = ana 09:00 ... rest
      + ana 11:00 A 1 0 0`,
  });
});

describe("takeEffect: since", () => {
  plays({
    "what is said takes effect from then, and shows that it was said": `
      08:00 ana shift-start
      08:00 ana run A
      09:00 ana run B since 08:45
      09:30 ana other meeting since 09:15
      10:00 ana shift-end
      = ana 08:00 08:45 run A
      = ana 08:45 09:15 run B (said)
      = ana 09:15 10:00 other meeting (said)`,
    "after a break the stretch was tapped again": `
      08:00 ana shift-start
      09:00 ana run B since 08:45
      09:30 ana rest
      09:40 ana break-end
      10:00 ana shift-end
      = ana 08:00 08:45 unassigned
      = ana 08:45 09:30 run B (said)
      = ana 09:30 09:40 rest
      = ana 09:40 10:00 run B`,
    "the beginning of the shift is within it": `
      08:00 ana shift-start
      08:20 ana run A since 08:00
      09:00 ana shift-end
      = ana 08:00 09:00 run A (said)`,
    "the moment of the tap is no saying": `
      08:00 ana shift-start
      08:20 ana run A since 08:20
      09:00 ana shift-end
      = ana 08:00 08:20 unassigned
      = ana 08:20 09:00 run A`,
    "before the shift it counts from the tap, and asks": `
      08:00 ana shift-start
      08:20 ana run A since 07:59:59 #a
      09:00 ana shift-end
      = ana 08:00 08:20 unassigned
      = ana 08:20 09:00 run A
      ? ana since-outside #a`,
    "half an hour back is within the site's limit, a second more is not": `
      08:00 ana shift-start
      09:00 ana run A since 08:30
      10:00 ana run B since 09:29:59 #b
      11:00 ana shift-end
      = ana 08:00 08:30 unassigned
      = ana 08:30 10:00 run A (said)
      = ana 10:00 11:00 run B
      ? ana since-outside #b`,
    "not after the last change of activity it counts from the tap, and asks": `
      08:00 ana shift-start
      08:10 ana run A
      08:20 ana run B since 08:10 #b
      08:30 ana rest
      08:40 ana run C since 08:25 #c
      08:50 ana done C 1
      09:00 ana run D since 08:45 #d
      09:10 ana shift-end
      = ana 08:00 08:10 unassigned
      = ana 08:10 08:20 run A
      = ana 08:20 08:30 run B
      = ana 08:30 08:40 rest
      = ana 08:40 08:50 run C
      = ana 08:50 09:00 unassigned
      = ana 09:00 09:10 run D
      + ana 08:50 C 1 0 0
      ? ana since-outside #b
      ? ana since-outside #c
      ? ana since-outside #d`,
    "the last change is when it was tapped, not from when it counts": `
      08:00 ana shift-start
      08:20 ana run A since 08:05
      08:30 ana run B since 08:10 #b
      09:00 ana shift-end
      = ana 08:00 08:05 unassigned
      = ana 08:05 08:30 run A (said)
      = ana 08:30 09:00 run B
      ? ana since-outside #b`,
    "a count in between is no change of activity": `
      08:00 ana shift-start
      08:00 ana run A
      08:20 ana count A 1
      08:30 ana run B since 08:15
      09:00 ana shift-end
      = ana 08:00 08:15 run A
      = ana 08:15 09:00 run B (said)
      + ana 08:20 A 1 0 0`,
    "later than the tap it counts from the tap, and asks": `
      08:00 ana shift-start
      08:20 ana run A since 08:21 #a
      09:00 ana shift-end
      = ana 08:00 08:20 unassigned
      = ana 08:20 09:00 run A
      ? ana since-outside #a`,
    "a break can be told to have ended earlier": `
      08:00 ana shift-start
      09:00 ana rest
      09:30 ana run A since 09:15
      10:00 ana shift-end
      = ana 08:00 09:00 unassigned
      = ana 09:00 09:15 rest
      = ana 09:15 10:00 run A (said)`,
  });
});

describe("takeEffect: two kiosks", () => {
  plays({
    "going from one kiosk to another is no contradiction": `
      08:00 ana shift-start @east
      08:10 ana run A @east
      10:00 ana run B @west
      10:30 ana done B 1 @west
      10:40 ana run A @east
      11:00 ana shift-end @west
      = ana 08:00 08:10 unassigned
      = ana 08:10 10:00 run A
      = ana 10:00 10:30 run B
      = ana 10:30 10:40 unassigned
      = ana 10:40 11:00 run A
      + ana 10:30 B 1 0 0`,
    "sooner than one can walk is one": `
      08:00 ana shift-start @east
      08:10 ana run A @east
      08:10:04 ana run B @west #b
      08:10:09 ana run C @east
      09:00 ana shift-end @east
      = ana 08:00 08:10 unassigned
      = ana 08:10 08:10:04 run A
      = ana 08:10:04 08:10:09 run B
      = ana 08:10:09 09:00 run C
      ? ana two-kiosks #b`,
    "ending work that another kiosk ended is one": `
      08:00 ana shift-start @east
      08:10 ana run A @east
      09:00 ana run B @west
      09:10 ana done A 1 @east #a
      10:00 ana shift-end @west
      = ana 08:00 08:10 unassigned
      = ana 08:10 09:00 run A
      = ana 09:00 10:00 run B
      + ana 09:10 A 1 0 0
      ? ana two-kiosks #a`,
    "ending a break that another kiosk ended is one": `
      08:00 ana shift-start @east
      09:00 ana rest @east
      09:10 ana run A @west
      09:15 ana break-end @east #end
      10:00 ana shift-end @west
      = ana 08:00 09:00 unassigned
      = ana 09:00 09:10 rest
      = ana 09:10 10:00 run A
      ? ana two-kiosks #end`,
    "a break's end where no kiosk ended one asks nothing": `
      08:00 ana shift-start @east
      08:10 ana run A @east
      09:00 ana break-end @west
      10:00 ana shift-end @east
      = ana 08:00 08:10 unassigned
      = ana 08:10 10:00 run A`,
    "at one kiosk the same asks nothing": `
      08:00 ana shift-start @east
      08:10 ana run A @east
      09:00 ana run B @east
      09:10 ana done A 1 @east
      09:11 ana break-end @east
      10:00 ana shift-end @east
      = ana 08:00 08:10 unassigned
      = ana 08:10 09:00 run A
      = ana 09:00 10:00 run B
      + ana 09:10 A 1 0 0`,
    "what a lead enters is at no other place": `
      08:00 ana shift-start @east
      08:10 ana run A @east
      08:10:02 ana run B @west by 7
      09:00 ana shift-end @office
      = ana 08:00 08:10 unassigned
      = ana 08:10 08:10:02 run A
      = ana 08:10:02 09:00 run B`,
  });
});
