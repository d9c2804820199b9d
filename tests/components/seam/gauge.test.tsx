// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { SeamGauge, type SeamGaugeProps } from "@/components/seam/gauge";

const minutes = (n: number) => n * 60;

/** A gauge of 48 min standard on a leaf of 64, unless told otherwise. */
function gauge(props: Partial<SeamGaugeProps> = {}) {
  const given = {
    standardSeconds: minutes(48),
    actualSeconds: minutes(31),
    state: "live" as const,
  };
  render(<SeamGauge scaleSeconds={minutes(64)} {...given} {...props} />);
  return screen.getByRole("img");
}

/** The board of a gauge by its class; null where it is not drawn. */
const board = (of: HTMLElement, name: string) => of.querySelector<HTMLElement>(`.seam-${name}`);

afterEach(cleanup);

describe("SeamGauge", () => {
  test.each<[string, Partial<SeamGaugeProps>, string]>([
    ["running", {}, "48 min standard, 31 min actual, 17 min left"],
    ["over", { actualSeconds: minutes(62) }, "48 min standard, 62 min actual, 14 over"],
    [
      "finished",
      { state: "finished", actualSeconds: minutes(44) },
      "48 min standard, 44 min actual, 4 under",
    ],
    ["held", { state: "held" }, "48 min standard, 31 min actual, 17 min left, held"],
    ["paused", { state: "paused" }, "48 min standard, 31 min actual, 17 min left, paused"],
    ["rework", { rework: true }, "48 min standard, 31 min actual, 17 min left, rework"],
    ["no standard", { standardSeconds: null }, "31 min actual, no standard"],
    ["other work", { standardSeconds: null, state: "other-work" }, "31 min actual, other work"],
    ["named", { name: "Carve neck" }, "Carve neck, 48 min standard, 31 min actual, 17 min left"],
  ])("says in words what is drawn: %s", (_, props, said) => {
    expect(gauge(props).getAttribute("aria-label")).toBe(said);
  });

  test("book and day stand on one scale, the unused standard is only an outline", () => {
    const drawn = gauge({ actualSeconds: minutes(32) });
    expect(board(drawn, "book")?.style.width).toBe("37.5%");
    expect(board(drawn, "day")?.style.width).toBe("25%");
    expect(board(drawn, "hand")?.style.left).toBe("75%");
    expect(board(drawn, "hand")?.style.width).toBe("12.5%");
    expect(board(drawn, "over")).toBeNull();
  });

  test("an overhang begins at the kerf, where the mirrored standard ends", () => {
    const drawn = gauge({ actualSeconds: minutes(56) });
    expect(board(drawn, "over")?.style.left).toBe("87.5%");
    expect(board(drawn, "over")?.style.width).toBe("calc(6.25% - var(--kerf))");
    expect(board(drawn, "hand")).toBeNull();
  });

  test("tolerance changes the word, never the drawing", () => {
    const drawn = gauge({ actualSeconds: minutes(50) });
    expect(drawn.getAttribute("aria-label")).toContain("on standard");
    expect(board(drawn, "over")).not.toBeNull();
  });

  test("without a standard the book is a blank leaf; other work has no book at all", () => {
    expect(board(gauge({ standardSeconds: null }), "blank")).not.toBeNull();
    cleanup();
    const other = gauge({ standardSeconds: null, state: "other-work" });
    expect(board(other, "blank")).toBeNull();
  });

  test("the piece that leaves the scale is marked for the zigzag rim", () => {
    const drawn = gauge({ actualSeconds: minutes(99) });
    expect(board(drawn, "over")?.dataset.folded).toBe("");
    expect(board(drawn, "day")?.dataset.folded).toBeUndefined();
  });

  test("held work carries the clamp", () => {
    expect(board(gauge({ state: "held" }), "clamp")).not.toBeNull();
  });

  test("only heroes say their verdict on the drawing", () => {
    expect(board(gauge({ size: "bench" }), "word")?.textContent).toBe("17 min left");
    cleanup();
    expect(board(gauge({ size: "cell" }), "word")).toBeNull();
  });

  test("a paper gauge has an empty rule, with the standard marked on it", () => {
    const drawn = gauge({ size: "paper" });
    expect(board(drawn, "day")).toBeNull();
    expect(board(drawn, "kerf")?.style.left).toBe("87.5%");
  });
});
