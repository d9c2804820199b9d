import type { Metadata } from "next";
import { readFloor } from "@/app/_server/floor";
import { personFor } from "@/app/_server/page-actor";
import { FloorBoard } from "@/components/floor/floor-board";
import { reachOf } from "@/lib/access/may";

export const metadata: Metadata = { title: "Floor" };

/** Who is on what, now. */
export default async function FloorPage() {
  const { person, scope } = await personFor("floor.see");
  const now = new Date();
  const floor = await readFloor(scope, now);
  const linksTickets = reachOf(person.held, "tickets.see") !== null;
  return <FloorBoard initial={floor} nowMs={now.getTime()} linksTickets={linksTickets} />;
}
