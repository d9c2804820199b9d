import { describe, expect, test } from "vitest";
import { cast } from "@/lib/demo/cast";
import type { Hall } from "@/lib/simulation/bench";
import { shiftOf } from "@/lib/simulation/shift";
import { currentStep } from "@/lib/simulation/traveller";
import {
  eventsOf,
  kindsOf,
  makeHall,
  makeShift,
  makeTraveller,
  personOf,
  through,
} from "@/tests/make/hall";

const person = personOf("Neck");
const shift = makeShift(person.number);
const tickets = () =>
  Array.from({ length: 20 }, (_, at) => makeTraveller({ number: String(at), operation: "280" }));

function play(hall: Hall) {
  through(shiftOf(hall, person, shift));
  return eventsOf(hall);
}

describe("shiftOf", () => {
  test("comes in around the start, works, eats, and goes home around the end", () => {
    const events = play(makeHall(tickets()));
    const [first, last] = [events[0]!, events.at(-1)!];
    expect(first.kind).toBe("shift-start");
    expect(Math.abs(Date.parse(first.at) / 1000 - shift.start)).toBeLessThan(1_200);
    expect(last.kind).toBe("shift-end");
    expect(Math.abs(Date.parse(last.at) / 1000 - shift.end)).toBeLessThan(600);
    const kinds = new Set(events.map(({ kind }) => kind));
    for (const kind of ["work", "report", "break-start", "break-end"] as const) {
      expect(kinds).toContain(kind);
    }
  });

  test("yields ever later seconds", () => {
    const seconds = [...shiftOf(makeHall(tickets()), person, shift)];
    expect(seconds).toEqual([...seconds].sort((a, b) => a - b));
  });

  test("without a ticket the time is other work, never nothing", () => {
    const events = play(makeHall([]));
    expect(events.filter(({ kind }) => kind === "indirect").length).toBeGreaterThan(10);
    expect(events.some(({ kind }) => kind === "work")).toBe(false);
  });

  test("somebody forgets to end the shift, and no tap tells", () => {
    const hall = makeHall(tickets());
    const events = play({ ...hall, troubles: { ...hall.troubles, forgetsToEnd: () => true } });
    expect(kindsOf(hall)).not.toContain("shift-end");
    const [question] = hall.questions;
    expect(question).toMatchObject({ worker: person.number, end: `no-shift-end:${events[0]!.id}` });
    const told = Date.parse(question!.answer.slice("end-at:".length));
    expect(told).toBeGreaterThan(Date.parse(events.at(-1)!.at));
    expect(told).toBeGreaterThanOrEqual(shift.end * 1000);
  });

  test("a lead answers what came up in the own cells the days before, in the lead's own session", () => {
    const hall = makeHall(tickets());
    const lead = cast.find(({ leads }) => leads.includes("Neck") && leads.length === 1)!;
    const from = shift.start - 86_400;
    const question = { worker: person.number, answer: "accept", from };
    hall.questions = [
      { ...question, cell: "Neck", end: "objection:1" },
      { ...question, cell: "Buff", end: "objection:2" },
      { ...question, cell: "Neck", end: "objection:3", from: shift.start - 60 },
    ];
    const troubles = { ...hall.troubles, isSettled: () => true };
    through(shiftOf({ ...hall, troubles }, lead, { ...shift, worker: lead.number }));
    const events = eventsOf(hall);
    const settled = events.filter(({ kind }) => kind === "settle");
    expect(settled).toHaveLength(1);
    expect(settled[0]).toMatchObject({
      end: "objection:1",
      worker: person.number,
      by: lead.number,
    });
    expect(settled[0]!.session).toBe(events[0]!.session);
    expect(hall.questions.map(({ end }) => end)).toEqual(["objection:2", "objection:3"]);
  });

  test("while the machines stand still nobody works in the cell", () => {
    const hall = makeHall(tickets());
    const events = play({ ...hall, troubles: { ...hall.troubles, isDown: () => true } });
    expect(events.some((event) => event.kind === "indirect" && event.code === "machine-down")).toBe(
      true,
    );
    expect(events.some(({ kind }) => kind === "work")).toBe(false);
  });

  test("a hasty hand takes up what is still being worked on, and lays it down again", () => {
    const ticket = makeTraveller({ operation: "230" });
    currentStep(ticket)!.crew.add("somebody");
    const hall = makeHall([ticket]);
    let once = 1;
    const events = play({ ...hall, troubles: { ...hall.troubles, isHasty: () => once-- === 1 } });
    const item = { ticket: ticket.number, operation: "250" };
    expect(events.find(({ kind }) => kind === "work")).toMatchObject({ items: [item] });
    expect(events.find(({ kind }) => kind === "pause")).toMatchObject({ items: [item] });
    expect(ticket.steps.find(({ operation }) => operation.code === "250")?.crew.size).toBe(0);
  });
});
