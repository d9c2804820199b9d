import type { StandardsQuery } from "@/lib/standards/schema";

/** The address of the page with some of what it says changed; what is empty is left out. */
export function standardsAddress(query: Partial<StandardsQuery>): string {
  const pairs = Object.entries(query).filter(([, value]) => value !== "");
  return pairs.length > 0 ? `/standards?${new URLSearchParams(pairs)}` : "/standards";
}
