// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, expect, test, vi } from "vitest";
import { Dialog } from "@/components/ui/dialog";

afterEach(cleanup);

/** A dialog whose only content is a sentence. */
const dialog = (open: boolean, onClose = () => undefined) => (
  <Dialog open={open} title="End the shift?" onClose={onClose}>
    <p>Two tickets are open.</p>
  </Dialog>
);

test("is the browser's dialog, named by its title, shown while it is open", () => {
  const shown = render(dialog(false));
  const element = shown.container.querySelector("dialog")!;
  expect(element.open).toBe(false);
  shown.rerender(dialog(true));
  expect(element.open).toBe(true);
  expect(screen.getByRole("dialog", { name: "End the shift?" })).toBe(element);
  shown.rerender(dialog(false));
  expect(element.open).toBe(false);
});

test("tells when the browser closes it", () => {
  const onClose = vi.fn();
  const { container } = render(dialog(true, onClose));
  container.querySelector("dialog")!.close();
  expect(onClose).toHaveBeenCalledOnce();
});
