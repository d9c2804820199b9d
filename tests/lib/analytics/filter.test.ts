import { describe, expect, test } from "vitest";
import { seamAddress, seamFilter } from "@/lib/analytics/filter";

describe("seamFilter", () => {
  test("what is odd counts as not said", () => {
    const odd = { from: "yesterday", basis: "guess", by: "person", open: "a\0b", over: "2" };
    expect(seamFilter.parse(odd)).toEqual(seamFilter.parse({}));
    expect(seamFilter.parse({})).toMatchObject({ basis: "matched", by: "model", open: "" });
  });
});

describe("seamAddress", () => {
  test("says what differs from the usual, and nothing else", () => {
    const filter = seamFilter.parse({ model: "Heron", open: "010", by: "week" });
    expect(seamAddress("/a", filter, { open: "" })).toBe("/a?model=Heron&by=week");
    expect(seamAddress("/a", filter, { by: "model" })).toBe("/a?model=Heron&open=010");
    expect(seamAddress("/a", seamFilter.parse({}), {})).toBe("/a");
  });
  test("an address leads back to its filter", () => {
    const filter = seamFilter.parse({
      cell: "Final set-up & more",
      basis: "booked",
      from: "2026-05-01",
    });
    const address = new URL(seamAddress("/a", filter, {}), "http://localhost");
    expect(seamFilter.parse(Object.fromEntries(address.searchParams))).toEqual(filter);
  });
});
