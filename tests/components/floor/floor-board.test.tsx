// @vitest-environment happy-dom
import { act, cleanup, render, screen } from "@testing-library/react";
import { SWRConfig } from "swr";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { FloorBoard } from "@/components/floor/floor-board";
import type { FloorView } from "@/lib/floor/schema";

const NOW = Date.UTC(2026, 4, 14, 13, 14);
const since = NOW / 1000 - 600;
const person = { worker: "1042", name: "Ilo Varn", since };
const work = {
  ticket: "26048176",
  operation: "110",
  name: "Carve neck",
  model: "Heron",
  options: [],
  quantity: 1,
  standardSeconds: 1200,
  bookedSeconds: 0,
  people: [{ ...person, activity: "run" as const, weights: [1], share: 0 }],
};
const cell = { cell: "Neck", inCount: 1, work: [work], elsewhere: [], missing: [] };
const floor: FloorView = { timeZone: "America/Chicago", cells: [cell], opensAt: null };

function show(initial: FloorView) {
  render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0 }}>
      <FloorBoard initial={initial} nowMs={NOW} linksTickets />
    </SWRConfig>,
  );
}

const pass = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));

describe("FloorBoard", () => {
  beforeEach(() => {
    vi.useFakeTimers({ now: NOW });
    vi.stubGlobal(
      "fetch",
      vi.fn(async () => Response.json(floor)),
    );
  });
  afterEach(() => {
    cleanup();
    vi.useRealTimers();
    vi.unstubAllGlobals();
  });

  test("asks nothing when it appears, and once every ten seconds from then on", async () => {
    show(floor);
    await pass(0);
    expect(fetch).toHaveBeenCalledTimes(0);
    await pass(10_000);
    expect(fetch).toHaveBeenCalledTimes(1);
    await pass(10_000);
    expect(fetch).toHaveBeenCalledTimes(2);
  });

  test("between two answers the time on the gauge goes on", async () => {
    show(floor);
    expect(screen.getByRole("img", { name: /Carve neck.* 10 min actual/ })).toBeDefined();
    await pass(300_000);
    expect(screen.getByRole("img", { name: /Carve neck.* 15 min actual/ })).toBeDefined();
    expect(screen.getByText("5 min left")).toBeDefined();
  });

  test("a server that is away leaves the last picture, with its time", async () => {
    show(floor);
    await pass(10_000);
    vi.mocked(fetch).mockImplementation(async () =>
      Response.json({ detail: "Not now." }, { status: 503 }),
    );
    await pass(60_000);
    const note = screen.getByText(/as of 08:14/);
    expect(note.textContent).toContain("Not now.");
    expect(screen.getByText("Ilo Varn")).toBeDefined();
    expect(screen.getByRole("img", { name: /Carve neck.* 10 min actual/ })).toBeDefined();
  });

  test("an overrun names cell, operation and ticket apart from the person", () => {
    show({ ...floor, cells: [{ ...cell, work: [{ ...work, standardSeconds: 300 }] }] });
    const over = screen.getAllByText(/5 over/)[0]!.closest("li")!;
    expect(over.textContent).toContain("Neck");
    expect(over.textContent).toContain("26-04817-6");
    expect(over.textContent).not.toContain("Ilo Varn");
  });

  test("a floor that nobody is on says when the hall opens", () => {
    show({ ...floor, cells: [], opensAt: NOW / 1000 + 86_400 });
    expect(screen.getByText(/No one is in. The hall opens on Fri 15 May at 08:14/)).toBeDefined();
  });
});
