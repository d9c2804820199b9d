import { type Action, type Held, reachOf } from "@/lib/access/may";

/** A page of the office that the head leads to. */
export interface Room {
  name: string;
  path: string;
  /** Another page of the same room. */
  also?: string;
  may: Action;
  /** Which leaf it stands on: what is known beforehand, or what happens. */
  leaf: "book" | "day";
}

/** The rooms of the office, in the order of the head. */
const rooms: readonly Room[] = [
  { name: "People", path: "/people", may: "people.see", leaf: "book" },
  { name: "Tickets", path: "/tickets", may: "tickets.see", leaf: "book" },
  { name: "Standards", path: "/standards", may: "standards.see", leaf: "book" },
  { name: "Kiosks", path: "/kiosks", may: "kiosks.see", leaf: "book" },
  { name: "Floor", path: "/floor", may: "floor.see", leaf: "day" },
  {
    name: "Seam",
    path: "/analytics/seam",
    also: "/analytics/cells",
    may: "analytics.see",
    leaf: "day",
  },
  { name: "Loose ends", path: "/ends", may: "ends.see", leaf: "day" },
  { name: "Hours", path: "/hours", may: "hours.see", leaf: "day" },
];

/** The rooms that someone with these roles may enter; may be empty. */
export function roomsFor(held: readonly Held[]): Room[] {
  return rooms.filter(({ may }) => reachOf(held, may) !== null);
}

/**
 * Where someone begins: on the floor if they may see it, else in the first room that is theirs; who
 * is nothing but a worker, with the own hours on the phone.
 */
export function homeFor(held: readonly Held[]): string {
  const mine = roomsFor(held);
  if (held.length > 0 && held.every(({ role }) => role === "worker")) return "/me";
  const first = mine.find(({ path }) => path === "/floor") ?? mine[0];
  return first?.path ?? "/account";
}
