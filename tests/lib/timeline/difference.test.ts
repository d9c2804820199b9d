import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { difference } from "@/lib/timeline/difference";

const keyOf = (row: { id: number }) => String(row.id);

describe("difference", () => {
  test("names what is gone and what is new or another, and leaves the rest alone", () => {
    const before = [
      { id: 1, text: "same" },
      { id: 2, text: "old" },
      { id: 3, text: "gone" },
    ];
    const after = [
      { text: "same", id: 1 },
      { id: 2, text: "new" },
      { id: 4, text: "added" },
    ];
    expect(difference(before, after, keyOf)).toEqual({
      gone: [{ id: 3, text: "gone" }],
      changed: [
        { id: 2, text: "new" },
        { id: 4, text: "added" },
      ],
    });
  });

  const rows = fc.uniqueArray(fc.record({ id: fc.nat(9), text: fc.constantFrom("a", "b", null) }), {
    selector: ({ id }) => id,
  });

  test("for any two sets, taking away and putting in makes the one the other", () => {
    fc.assert(
      fc.property(rows, rows, (before, after) => {
        const { gone, changed } = difference(before, after, keyOf);
        const made = new Map(before.map((row) => [row.id, row]));
        for (const { id } of gone) made.delete(id);
        for (const row of changed) made.set(row.id, row);
        const byId = (a: { id: number }, b: { id: number }) => a.id - b.id;
        expect([...made.values()].sort(byId)).toEqual([...after].sort(byId));
      }),
    );
  });

  test("for any set, nothing differs from itself", () => {
    fc.assert(
      fc.property(rows, (same) => {
        expect(difference(same, structuredClone(same), keyOf)).toEqual({ gone: [], changed: [] });
      }),
    );
  });
});
