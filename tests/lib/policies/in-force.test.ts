import { describe, expect, test } from "vitest";
import { policyLabel, policyOn } from "@/lib/policies/in-force";
import { makePolicyBook, makeVersion } from "@/tests/make/policies";

const first = makeVersion("2026-01-05");
const second = makeVersion("2026-03-01", { version: 2 });
const third = makeVersion("2026-03-01", { version: 3 });
const shop = makeVersion("2026-01-05", { name: "shop", policy: {} });
const own = { worker: "w1", policy: "shop", effectiveOn: "2026-02-01" };
const back = { worker: "w1", policy: null, effectiveOn: "2026-04-01" };
const book = makePolicyBook([first, second, third, shop], [own, back]);

describe("policyOn", () => {
  test.each([
    ["2026-02-28", "us-federal 1", "the version of that day"],
    ["2026-03-01", "us-federal 3", "of two of one day the later entry"],
    ["2025-06-01", "us-federal 1", "what is older than the first goes by the first"],
  ])("the site on %s: %s, %s", (date, label) => {
    expect(policyLabel(policyOn(book, null, date)!)).toBe(label);
    expect(policyLabel(policyOn(book, "w2", date)!)).toBe(label);
  });
  test.each([
    ["2026-01-31", "us-federal 1"],
    ["2026-02-01", "shop 1"],
    ["2026-03-31", "shop 1"],
    ["2026-04-01", "us-federal 3"],
  ])("a worker's own choice counts from its day until it is taken back: %s, %s", (date, label) => {
    expect(policyLabel(policyOn(book, "w1", date)!)).toBe(label);
  });
  test("a choice of the same day entered later counts", () => {
    const again = { ...own, policy: "us-federal" };
    const changed = makePolicyBook([first, shop], [own, again]);
    expect(policyOn(changed, "w1", "2026-02-01")!.name).toBe("us-federal");
  });
  test("is null where no policy was chosen", () => {
    expect(policyOn({ versions: [first], choices: [] }, "w1", "2026-02-01")).toBeNull();
  });
  test("refuses a choice of a policy that has no version", () => {
    const lost = { versions: [], choices: [{ ...own, worker: null }] };
    expect(() => policyOn(lost, null, "2026-02-01")).toThrow("no version of shop");
  });
});
