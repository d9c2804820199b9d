import type { Held } from "@/lib/access/may";

/** The roles that someone holds, as one says them: `admin and lead`. Empty for none. */
export function roleWords(held: readonly Held[]): string {
  return held.map(({ role }) => role).join(" and ");
}
