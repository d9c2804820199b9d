// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, expect, test, vi } from "vitest";
import { AcrossPlate, Plate } from "@/components/ui/plate";

afterEach(cleanup);

test("a plate is a button that submits no form unless told to", () => {
  const submit = vi.fn((event: { preventDefault: () => void }) => event.preventDefault());
  const press = vi.fn();
  render(
    <form onSubmit={submit}>
      <Plate icon="scan" onClick={press}>
        Scan ticket
      </Plate>
      <Plate type="submit">Send</Plate>
    </form>,
  );
  fireEvent.click(screen.getByRole("button", { name: "Scan ticket" }));
  expect([press.mock.calls.length, submit.mock.calls.length]).toEqual([1, 0]);
  fireEvent.click(screen.getByRole("button", { name: "Send" }));
  expect(submit).toHaveBeenCalledOnce();
});

test("only a secondary plate is marked as one that may be smaller", () => {
  render(
    <>
      <Plate>Done</Plate>
      <Plate minor>Not now</Plate>
    </>,
  );
  expect(screen.getByRole("button", { name: "Done" }).hasAttribute("data-minor")).toBe(false);
  expect(screen.getByRole("button", { name: "Not now" }).hasAttribute("data-minor")).toBe(true);
});

test("a plate across the seam is named by both of its sides", () => {
  render(<AcrossPlate then="count good, rework, scrap">Done</AcrossPlate>);
  expect(screen.getByRole("button", { name: "Done count good, rework, scrap" })).toBeDefined();
});
