import { describe, expect, test } from "vitest";
import { actualSeconds, headCount, overruns } from "@/lib/floor/actual";
import type { FloorView, FloorWork } from "@/lib/floor/schema";

const person = (worker: string, since: number, weights = [1], share = 0) => ({
  worker,
  name: worker,
  since,
  activity: "run" as const,
  weights,
  share,
});

const work = (fields: Partial<FloorWork> = {}): FloorWork => ({
  ticket: "26048176",
  operation: "110",
  name: "Carve neck",
  model: "Heron",
  options: [],
  quantity: 1,
  standardSeconds: 3600,
  bookedSeconds: 600,
  people: [person("1042", 1000)],
  ...fields,
});

const floor = (cells: FloorView["cells"]): FloorView => ({ timeZone: "UTC", cells, opensAt: null });
const cell = (fields: Partial<FloorView["cells"][number]>) => ({
  cell: "Neck",
  inCount: 1,
  work: [],
  elsewhere: [],
  missing: [],
  ...fields,
});

describe("actualSeconds", () => {
  test("adds what everyone on it is doing now to what is booked", () => {
    expect(actualSeconds(work(), 1060)).toBe(660);
    const two = work({ people: [person("1042", 1000), person("1050", 1030)] });
    expect(actualSeconds(two, 1060.9)).toBe(690);
  });

  test("one who minds three tickets adds a fair share to each, and the shares are whole", () => {
    const shares = [0, 1, 2].map((share) =>
      actualSeconds(
        work({ bookedSeconds: 0, people: [person("1042", 1000, [1, 1, 1], share)] }),
        1100,
      ),
    );
    expect(shares).toEqual([34, 33, 33]);
  });

  test("a clock behind the server's adds nothing", () => {
    expect(actualSeconds(work(), 990)).toBe(600);
  });
});

describe("overruns", () => {
  test("names cell, operation and ticket, and no person", () => {
    const late = work({ bookedSeconds: 4440 });
    const here = floor([cell({ work: [work(), late] })]);
    expect(overruns(here, 1060)).toEqual([
      { cell: "Neck", ticket: "26048176", operation: "110", name: "Carve neck", overMinutes: 15 },
    ]);
  });

  test("within five per cent is on standard, and without a standard nothing is over", () => {
    const within = work({ bookedSeconds: 3700 });
    const without = work({ bookedSeconds: 99_999, standardSeconds: null });
    expect(overruns(floor([cell({ work: [within, without] })]), 1060)).toEqual([]);
  });
});

describe("headCount", () => {
  test("counts someone on three tickets once", () => {
    const elsewhere = (["indirect", "meal", "rest", "unassigned"] as const).map((doing) => ({
      worker: doing,
      name: doing,
      since: 0,
      doing,
      code: null,
    }));
    const missing = [{ worker: "9", name: "9", plannedAt: 0 }];
    const here = floor([
      cell({ work: [work(), work({ ticket: "2" })], elsewhere, missing }),
      cell({ cell: "Body", work: [work({ people: [person("1050", 0)] })] }),
    ]);
    expect(headCount(here)).toEqual({
      onTickets: 2,
      onOtherWork: 1,
      onBreak: 2,
      onNothing: 1,
      missing: 1,
    });
  });
});
