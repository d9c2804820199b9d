// @vitest-environment happy-dom
import { cleanup, fireEvent, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { draw } from "@/tests/components/kiosk";
import { TestKiosk } from "@/tests/make/bench";

afterEach(cleanup);

const button = (name: string | RegExp) => screen.getByRole("button", { name });
const counting = () => TestKiosk.atWork().send({ on: "count" });

describe("CountScreen", () => {
  test("begins as if all that is open came out good: one touch closes it", () => {
    const taps = draw(counting());
    expect(button("Key the count: Good, 4")).toBeDefined();
    expect(screen.queryByRole("button", { name: "Count, work on" })).toBeNull();
    fireEvent.click(button("Done"));
    expect(taps).toEqual([{ on: "counted", stop: true }]);
  });

  test("what is not good asks why before it closes, and lets the work run on", () => {
    draw(counting().send({ on: "step", field: "rework", by: 1 }));
    expect(button("Key the count: Good, 3")).toBeDefined();
    expect(button("Say why 1 is not good")).toBeDefined();
    expect(button("Count, work on")).toBeDefined();
  });

  test("nothing counted puts the work aside and says so", () => {
    const none = { on: "step", field: "good", by: -1 } as const;
    draw(counting().send(none, none, none, none));
    expect(button(/^Put it aside/)).toBeDefined();
  });

  test("each count is stepped or keyed by its own name", () => {
    const taps = draw(counting());
    fireEvent.click(button("One more: Scrap"));
    fireEvent.click(button("One fewer: Good"));
    fireEvent.click(button("Key the count: Rework, 0"));
    expect(taps).toEqual([
      { on: "step", field: "scrap", by: 1 },
      { on: "step", field: "good", by: -1 },
      { on: "key-count", field: "rework" },
    ]);
  });
});

describe("ScrapScreen", () => {
  test("scrap is asked about once more, with the way back on the book's side", () => {
    const kiosk = counting().send({ on: "step", field: "scrap", by: 1 });
    kiosk.send({ on: "counted", stop: false }, { on: "cause", operation: "110" });
    const taps = draw(kiosk);
    expect(screen.getByRole("heading").textContent).toContain("1 piece is scrap");
    fireEvent.click(button("Yes, scrap"));
    expect(taps).toEqual([{ on: "go-ahead" }]);
  });
});
