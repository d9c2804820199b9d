import type { PresentElsewhere } from "@/lib/floor/schema";
import { groupBy } from "@/lib/group";

/**
 * Gathers who is in and on no ticket into the lines that the floor shows: each on other work alone,
 * for each has a gauge; those on nothing yet, on a meal and on a rest together, in that order.
 */
export function gatherElsewhere(people: readonly PresentElsewhere[]): PresentElsewhere[][] {
  const byDoing = groupBy(people, ({ doing }) => doing);
  const together = (["unassigned", "meal", "rest"] as const).flatMap((doing) => {
    const group = byDoing.get(doing);
    return group ? [group] : [];
  });
  return [...(byDoing.get("indirect") ?? []).map((one) => [one]), ...together];
}
