// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { Keypad, type KeypadProps } from "@/components/ui/keypad";

/** A pad that writes down what it was told. */
function pad(props: Partial<KeypadProps> = {}) {
  const told: string[] = [];
  render(
    <Keypad
      onDigit={(digit) => told.push(digit)}
      onRubOut={() => told.push("rub out")}
      onOk={() => told.push("ok")}
      okLabel="Next"
      rubOutLabel="Rub out"
      {...props}
    />,
  );
  return told;
}

afterEach(cleanup);

describe("Keypad", () => {
  test("tells each board that is touched", () => {
    const told = pad();
    for (const name of ["2", "0", "Rub out", "Next"]) {
      fireEvent.click(screen.getByRole("button", { name }));
    }
    expect(told).toEqual(["2", "0", "rub out", "ok"]);
  });

  test("types from a keyboard: digits, Backspace and Enter, and nothing else", () => {
    const told = pad();
    for (const key of ["7", "Backspace", "Enter", "a", "F7", " "]) {
      fireEvent.keyDown(window, { key });
    }
    fireEvent.keyDown(window, { key: "7", ctrlKey: true });
    expect(told).toEqual(["7", "rub out", "ok"]);
  });

  test("leaves a key alone that something else has taken", () => {
    const told = pad();
    const take = (event: Event) => event.preventDefault();
    window.addEventListener("keydown", take, { capture: true });
    fireEvent.keyDown(document.body, { key: "7" });
    window.removeEventListener("keydown", take, { capture: true });
    expect(told).toEqual([]);
  });

  test("leaves the keyboard to a field that has the focus", () => {
    const told = pad();
    render(<input aria-label="note" />);
    fireEvent.keyDown(screen.getByLabelText("note"), { key: "7" });
    expect(told).toEqual([]);
  });

  test("Enter on a board is that board's touch, not an ok besides", () => {
    const told = pad();
    fireEvent.keyDown(screen.getByRole("button", { name: "2" }), { key: "Enter" });
    expect(told).toEqual([]);
  });

  test("a closed ok takes neither touch nor Enter", () => {
    const told = pad({ okDisabled: true });
    fireEvent.click(screen.getByRole("button", { name: "Next" }));
    fireEvent.keyDown(window, { key: "Enter" });
    expect(told).toEqual([]);
  });

  test("listens no more once it is gone", () => {
    const told = pad();
    cleanup();
    fireEvent.keyDown(window, { key: "7" });
    expect(told).toEqual([]);
  });
});
