import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { bunchesOf, secondOf } from "@/lib/sheet/bunches";

const at = (...seconds: number[]) => seconds.map((second) => ({ atMs: second * 1000 }));
const cut = (...seconds: number[]) =>
  bunchesOf(at(...seconds)).map((bunch) => bunch.map((tap) => tap.atMs / 1000));

describe("bunchesOf", () => {
  test("taps 30 s apart are one bunch, 31 s apart are two", () => {
    expect(cut(0, 30)).toEqual([[0, 30]]);
    expect(cut(0, 31)).toEqual([[0], [31]]);
  });
  test("a chain of near taps is one bunch, however long it is", () => {
    expect(cut(0, 25, 50, 75, 200)).toEqual([[0, 25, 50, 75], [200]]);
  });
  test("no taps are no bunch", () => {
    expect(bunchesOf([])).toEqual([]);
  });
  test("fractions of a second do not part what whole seconds keep together", () => {
    expect(bunchesOf([{ atMs: 0 }, { atMs: 30_900 }])).toHaveLength(1);
  });
  test("for any taps in order, none is lost and bunches lie more than 30 s apart", () => {
    fc.assert(
      fc.property(fc.array(fc.nat(2_000)), (seconds) => {
        const taps = at(...seconds.sort((a, b) => a - b));
        const bunches = bunchesOf(taps);
        expect(bunches.flat()).toEqual(taps);
        for (const [place, bunch] of bunches.entries()) {
          const next = bunches[place + 1];
          if (next) expect(next[0]!.atMs - bunch.at(-1)!.atMs).toBeGreaterThan(30_000);
        }
      }),
    );
  });
});

describe("secondOf", () => {
  test("an instant counts at the second that has begun", () => {
    expect(secondOf({ atMs: 1_999 })).toBe(1);
  });
});
