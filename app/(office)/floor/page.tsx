import type { Metadata } from "next";
import { readFloor } from "@/app/_server/floor";
import { personFor } from "@/app/_server/page-actor";
import { enterForgotten } from "@/app/(office)/floor/actions";
import { FloorBoard } from "@/components/floor/floor-board";
import { listNumbersOf } from "@/db/people/queries";
import { cellsOf, reachOf } from "@/lib/access/may";

export const metadata: Metadata = { title: "Floor" };

/** Who is on what, now. */
export default async function FloorPage() {
  const { person, scope } = await personFor("floor.see");
  const now = new Date();
  const reach = reachOf(person.held, "records.correct");
  const [floor, own] = await Promise.all([
    readFloor(scope, now),
    reach === "cells" ? listNumbersOf(scope, cellsOf(person.held)) : null,
  ]);
  const linksTickets = reachOf(person.held, "tickets.see") !== null;
  const forgotten = reach && { action: enterForgotten, workers: own };
  return (
    <FloorBoard
      initial={floor}
      nowMs={now.getTime()}
      linksTickets={linksTickets}
      forgotten={forgotten}
    />
  );
}
