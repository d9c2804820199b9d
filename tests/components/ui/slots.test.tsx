// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { Slots } from "@/components/ui/slots";

afterEach(cleanup);

/** The slots as words: the digit, `_` for an empty one, `>` before the next, `?` before a doubt. */
function slots(): string {
  return [...screen.getByRole("img").children]
    .map((slot) => {
      if (slot.tagName === "I") return "-";
      const { next, doubt } = (slot as HTMLElement).dataset;
      return `${next === "" ? ">" : ""}${doubt === "" ? "?" : ""}${slot.textContent || "_"}`;
    })
    .join(" ");
}

test("without a length there is always one more slot, the next one", () => {
  render(<Slots digits="21" label="Worker number, 2 1 keyed" />);
  expect(screen.getByRole("img", { name: "Worker number, 2 1 keyed" })).toBeDefined();
  expect(slots()).toBe("2 1 >_");
});

test("a number of known length shows its slots and hyphens from the start", () => {
  render(<Slots digits="26" label="Ticket" length={8} hyphensAfter={[2, 7]} />);
  expect(slots()).toBe("2 6 - >_ _ _ _ _ - _");
});

test("the digit in doubt is outlined, and nothing keyed is taken away", () => {
  render(<Slots digits="260491876" label="Ticket" length={8} doubtAt={4} />);
  expect(slots()).toBe("2 6 0 4 ?9 1 8 7 6");
});

test("a PIN shows how many digits are keyed, never which", () => {
  render(<Slots digits="217" label="PIN, 3 of 4 keyed" length={4} hidden />);
  expect(slots()).toBe("• • • >_");
});
