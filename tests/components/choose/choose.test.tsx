// @vitest-environment happy-dom
import { cleanup, fireEvent, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { showTicket } from "@/lib/codes/ticket-code";
import { draw } from "@/tests/components/kiosk";
import { AVOCET, HERON, PLOVER, TestKiosk, WREN } from "@/tests/make/bench";

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole("button", { name });
const scanning = () => TestKiosk.atBench().send({ on: "scan-for", add: false });
const shown = (ticket: string) => TestKiosk.atBench().send({ on: "scan", text: `T${ticket}` });

describe("ScanScreen", () => {
  test("a wrong digit is told, and the nearest ticket of the cell is one touch away", () => {
    const wrong = HERON.slice(0, -1) + String((Number(HERON.at(-1)) + 1) % 10);
    const taps = draw(scanning().key(wrong).send({ on: "submit" }));
    expect(screen.getByRole("alert").textContent).toBe("one digit is not right");
    fireEvent.click(button(new RegExp(`^Nearest in your cell is ${showTicket(HERON)}`)));
    expect(taps).toEqual([{ on: "take-ticket", ticket: HERON }]);
  });

  test("without a camera it says to key the number", async () => {
    draw(scanning());
    expect(await screen.findByText("No camera here. Key the number.")).toBeDefined();
  });
});

describe("CellTicketsScreen", () => {
  test("lists the cell's tickets, each one touch", () => {
    const taps = draw(scanning().send({ on: "show-cell-tickets" }));
    fireEvent.click(button(new RegExp(`^${showTicket(WREN)}`)));
    expect(taps).toEqual([{ on: "take-ticket", ticket: WREN }]);
  });
});

describe("OfferScreen", () => {
  test("one way on is one board across the seam", () => {
    const taps = draw(shown(HERON));
    expect(screen.getByRole("heading").textContent).toBe("Fret press and levelIs it this?");
    fireEvent.click(button(/^Run/));
    const choice = { ticket: HERON, operation: "120", activity: "run" };
    expect(taps).toEqual([{ on: "take", choice }]);
  });

  test("setup is offered until it is earned", () => {
    draw(shown(WREN));
    expect(button(/^Set up: Fret press and level/)).toBeDefined();
    expect(button(/^Run: Fret press and level/)).toBeDefined();
  });
});

describe("RefusedScreen", () => {
  test("a ticket that is next elsewhere says where, and how to go on", () => {
    draw(shown(PLOVER));
    expect(screen.getByRole("heading").textContent).toContain("It is for Spray next");
    for (const name of [/^Call the lead/, /^Start anyway/, /^Pick another/]) {
      expect(button(name)).toBeDefined();
    }
  });
});

describe("CautionScreen", () => {
  test("comes before the work, and going on is the day's side", () => {
    const choice = { ticket: AVOCET, operation: "120", activity: "run" } as const;
    const taps = draw(shown(AVOCET).send({ on: "take", choice }));
    fireEvent.click(button("Not now"));
    fireEvent.click(button("Yes, start"));
    expect(taps).toEqual([{ on: "back" }, { on: "go-ahead" }]);
  });
});
