import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { inOrder, type Ordered } from "@/lib/ledger/order";

const place = (id: string, atMs: number, kiosk: string | null, seq: number): Ordered => ({
  id,
  atMs,
  kiosk,
  seq,
});
const ids = (events: readonly Ordered[]) => inOrder(events).map(({ id }) => id);

describe("inOrder", () => {
  test.each([
    {
      because: "the instant comes first",
      of: [place("a", 2, "east", 1), place("b", 1, "east", 2)],
      is: ["b", "a"],
    },
    {
      because: "at one instant a kiosk's own number decides",
      of: [place("a", 1, "east", 2), place("b", 1, "east", 1)],
      is: ["b", "a"],
    },
    {
      because: "numbers of two kiosks say nothing to each other, so the id decides",
      of: [place("b", 1, "east", 1), place("a", 1, "west", 9)],
      is: ["a", "b"],
    },
    {
      because: "the same number twice falls back on the id",
      of: [place("b", 1, "east", 1), place("a", 1, "east", 1)],
      is: ["a", "b"],
    },
    {
      because: "a circle of pairs is cut the same way whoever comes first",
      of: [place("c", 1, "east", 1), place("b", 1, "west", 1), place("a", 1, "east", 2)],
      is: ["b", "c", "a"],
    },
  ])("$because", ({ of, is }) => {
    expect(ids(of)).toEqual(is);
    expect(ids([...of].reverse())).toEqual(is);
  });

  const event = fc.record({
    id: fc.uuid(),
    atMs: fc.nat(3),
    kiosk: fc.constantFrom("east", "west", null),
    seq: fc.nat(3),
  });
  const events = fc.uniqueArray(event, { maxLength: 12, selector: ({ id }) => id });

  test("for any events, arrival plays no part", () => {
    fc.assert(
      fc.property(
        events.chain((list) =>
          fc.tuple(
            fc.constant(list),
            fc.shuffledSubarray(list, { minLength: list.length, maxLength: list.length }),
          ),
        ),
        ([list, shuffled]) => {
          expect(inOrder(shuffled)).toEqual(inOrder(list));
        },
      ),
    );
  });

  test("for any events, time and each kiosk's own number never go backwards", () => {
    fc.assert(
      fc.property(events, (list) => {
        const ordered = inOrder(list);
        expect(new Set(ordered)).toEqual(new Set(list));
        ordered.forEach((later, index) => {
          for (const earlier of ordered.slice(0, index)) {
            expect(earlier.atMs).toBeLessThanOrEqual(later.atMs);
            if (earlier.atMs === later.atMs && earlier.kiosk === later.kiosk)
              expect(earlier.seq).toBeLessThanOrEqual(later.seq);
          }
        });
      }),
    );
  });
});
