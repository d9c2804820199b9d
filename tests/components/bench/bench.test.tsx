// @vitest-environment happy-dom
import { cleanup, fireEvent, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { showTicket } from "@/lib/codes/ticket-code";
import { draw } from "@/tests/components/kiosk";
import { HERON, TestKiosk, WREN } from "@/tests/make/bench";

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole("button", { name });
const names = () => screen.getAllByRole("button").map(({ textContent }) => textContent);

describe("BenchScreen", () => {
  test("on no ticket, the one thing across the seam is to scan one", () => {
    const taps = draw(TestKiosk.atBench());
    expect(screen.getByRole("heading").textContent).toBe("What is next?on no ticket");
    fireEvent.click(button(/^Scan a ticket/));
    expect(taps).toEqual([{ on: "scan-for", add: false }]);
  });

  test("on a ticket, the gauge tells standard and actual, and what is left", () => {
    draw(TestKiosk.atWork().touch(540));
    expect(
      screen.getByRole("img", { name: /45 min standard.*10 min actual.*35 min left/ }),
    ).toBeDefined();
    expect(screen.getByText("0 good, 4 to go")).toBeDefined();
  });

  test("past the standard, it says by how much and nothing else", () => {
    draw(TestKiosk.atWork().touch(50 * 60));
    expect(
      screen.getByRole("img", { name: /45 min standard.*51 min actual.*6 over/ }),
    ).toBeDefined();
  });

  test("adding a ticket and changing to another are two plain buttons", () => {
    const taps = draw(TestKiosk.atWork());
    fireEvent.click(button("Add a ticket"));
    fireEvent.click(button("Change ticket"));
    expect(taps).toEqual([
      { on: "scan-for", add: true },
      { on: "scan-for", add: false },
    ]);
  });

  test("several tickets are listed, each with its share of the time", () => {
    draw(TestKiosk.atWork().take(WREN, true).send({ on: "stay" }).touch(60));
    expect(screen.getByRole("heading").textContent).toContain("2 tickets at once");
    const rows = screen.getAllByRole("listitem").map(({ textContent }) => textContent ?? "");
    expect(rows.some((row) => row.includes(showTicket(HERON)))).toBe(true);
    expect(rows.some((row) => row.includes(showTicket(WREN)))).toBe(true);
    for (const row of rows) expect(row).toMatch(/\d+ % of your time/);
  });

  test("on a break, the way back to the work is the one solid act, and no break is offered", () => {
    const kiosk = TestKiosk.atWork().send({ on: "show-break" }, { on: "break", break: "rest" });
    const taps = draw(kiosk.send({ on: "stay" }));
    expect(screen.getByRole("heading").textContent).toContain("Rest break");
    expect(names()).not.toContain("Break");
    fireEvent.click(button(/^Back to work/));
    expect(taps).toEqual([{ on: "end-break" }]);
  });
});
