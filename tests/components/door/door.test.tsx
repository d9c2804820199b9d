// @vitest-environment happy-dom
import { cleanup, fireEvent, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { draw } from "@/tests/components/kiosk";
import { NIA, TestKiosk } from "@/tests/make/bench";

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole<HTMLButtonElement>("button", { name });

describe("DoorScreen", () => {
  test("takes a number, and goes on only once there is one", () => {
    const taps = draw(TestKiosk.atDoor());
    expect(button("Next").disabled).toBe(true);
    fireEvent.click(button("1"));
    expect(taps).toEqual([{ on: "digit", digit: "1" }]);
  });

  test("shows which language it speaks, and changes it at a touch", () => {
    const taps = draw(TestKiosk.atDoor());
    expect(button("English").getAttribute("aria-pressed")).toBe("true");
    fireEvent.click(button("Español"));
    expect(taps).toEqual([{ on: "language", language: "es" }]);
  });

  test("says that a ticket is no badge", () => {
    draw(TestKiosk.atDoor().send({ on: "scan", text: "T26048176" }));
    expect(screen.getByRole("heading").textContent).toBe(
      "That is a ticket. Badge or number first.",
    );
  });

  test("offers to take an act back for the rest of its ten seconds, and then no more", () => {
    const kiosk = TestKiosk.atBench().send({ on: "show-other-work" });
    kiosk.send({ on: "other-work", code: "cleaning" }, { on: "leave" });
    const taps = draw(kiosk);
    fireEvent.click(button(/^Undo/));
    expect(taps).toEqual([{ on: "undo" }]);
    cleanup();
    draw(kiosk.pass(10));
    expect(screen.queryByRole("button", { name: /^Undo/ })).toBeNull();
  });
});

describe("PinScreen", () => {
  const atPin = () => TestKiosk.atDoor().key(NIA).send({ on: "submit" });

  test("asks by name and never shows a digit of the PIN", () => {
    draw(atPin().key("27"));
    expect(screen.getByRole("heading").textContent).toBe("Your PIN, Nia Vale");
    expect(screen.getByRole("img", { name: "2 digits keyed" }).textContent).not.toMatch(/\d/);
  });

  test("says the same words whatever was wrong, and asks anew", () => {
    const refused = {
      on: "sign-in-refused",
      worker: NIA,
      says: "wrong",
      waitSeconds: null,
    } as const;
    draw(atPin().key("111111").send(refused));
    expect(screen.getByRole("heading").textContent).toBe(
      "Number and PIN do not go together. Key the PIN again.",
    );
  });

  test("tells how long to wait, and takes no PIN meanwhile", () => {
    const refused = { on: "sign-in-refused", worker: NIA, says: "wrong", waitSeconds: 30 } as const;
    draw(atPin().key("111111").send(refused).pass(10));
    expect(screen.getByRole("heading").textContent).toBe("Wait 20 seconds, then key it again.");
    expect(button("Sign in").disabled).toBe(true);
  });
});

describe("EnrolScreen", () => {
  test("hands a code in once it is keyed", () => {
    const kiosk = TestKiosk.atDoor().send({ on: "show-enrol" });
    const taps = draw(kiosk);
    expect(button("Enrol").disabled).toBe(true);
    fireEvent.change(screen.getByLabelText("Code"), { target: { value: "K7QF-3MZ9" } });
    fireEvent.click(button("Enrol"));
    expect(taps).toEqual([{ on: "enrol", code: "K7QF-3MZ9" }]);
  });

  test("says that records which wait here go in first", () => {
    const kiosk = TestKiosk.atDoor().send({ on: "show-enrol" });
    draw(kiosk.send({ on: "enrol-refused", says: "kept" }));
    expect(screen.getByRole("status").textContent).toMatch(/^Records wait here and go in first/);
  });
});
