// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { Icon } from "@/components/ui/icon";
import { type IconName, iconPaths } from "@/components/ui/icon-paths";
import { Sign } from "@/components/ui/sign";
import { type SignName, signPictures } from "@/components/ui/sign-pictures";

afterEach(cleanup);

describe("Icon", () => {
  test("is silent beside its word and speaks where it stands alone", () => {
    const { container } = render(<Icon name="rest" />);
    expect(container.querySelector("svg")?.getAttribute("aria-hidden")).toBe("true");
    render(<Icon name="clamp" label="held" />);
    expect(screen.getByRole("img", { name: "held" })).toBeDefined();
  });

  test.each(Object.keys(iconPaths) as IconName[])("%s stays on its 32 grid", (name) => {
    // absolute points only: relative ones move within what these span
    const points = iconPaths[name].flatMap(({ d }) =>
      [...d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)].flatMap(([, x, y]) => [Number(x), Number(y)]),
    );
    expect(points.length).toBeGreaterThan(0);
    expect(Math.min(...points)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...points)).toBeLessThanOrEqual(32);
  });
});

describe("Sign", () => {
  test.each(Object.keys(signPictures) as SignName[])("%s has the frame of what it asks", (name) => {
    const { container } = render(<Sign name={name} label="a sign" />);
    expect(screen.getByRole("img", { name: "a sign" })).toBeDefined();
    const triangle = container.querySelector('path[stroke="var(--caution-ink)"]') !== null;
    const disc = container.querySelector('circle[fill="var(--mandatory)"][r="48"]') !== null;
    const ring = container.querySelector('[stroke="var(--prohibition)"]') !== null;
    expect([triangle, disc, ring]).toEqual(["w", "m", "p"].map((kind) => name.startsWith(kind)));
  });
});
