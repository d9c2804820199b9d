import { describe, expect, test } from "vitest";
import { gatherElsewhere } from "@/lib/floor/gather";
import type { PresentElsewhere } from "@/lib/floor/schema";

const someone = (worker: string, doing: PresentElsewhere["doing"]): PresentElsewhere => ({
  worker,
  name: worker,
  since: 0,
  doing,
  code: doing === "indirect" ? "cleaning" : null,
});

describe("gatherElsewhere", () => {
  test("keeps other work apart and puts those on the same break on one line, nobody lost", () => {
    const people = [
      someone("1", "meal"),
      someone("2", "indirect"),
      someone("3", "rest"),
      someone("4", "meal"),
      someone("5", "indirect"),
      someone("6", "unassigned"),
    ];
    const lines = gatherElsewhere(people).map((line) => line.map(({ worker }) => worker));
    expect(lines).toEqual([["2"], ["5"], ["6"], ["1", "4"], ["3"]]);
  });

  test("nobody makes no line", () => expect(gatherElsewhere([])).toEqual([]));
});
