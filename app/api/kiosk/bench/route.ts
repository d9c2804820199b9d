import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { findBench } from "@/db/kiosks/bench";
import { findWorkerToSignIn } from "@/db/people/sign-in";
import { cellsOf, reachOf } from "@/lib/access/may";
import { benchQuery } from "@/lib/kiosks/schema";
import { no, ok } from "@/lib/result";

/** What a worker's own screen shows now. */
export const GET = handle(
  { actor: "worker", query: benchQuery },
  async ({ actor, query, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    const number = query.worker ?? actor.number;
    if (number !== actor.number) {
      const other = await findWorkerToSignIn(scope, number);
      const reach = reachOf(actor.held, "records.correct");
      const isOwn = other && cellsOf(actor.held).includes(other.homeCellId);
      if (reach !== "site" && !isOwn) {
        return no("forbidden", "Only the lead of this person's cell sees this bench.");
      }
    }
    const bench = await findBench(scope, { kioskId: actor.kioskId, number, at: receivedAt });
    return bench ? ok(bench) : no("notFound", "This number is not known here.");
  },
);
