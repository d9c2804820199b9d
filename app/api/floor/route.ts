import { database } from "@/app/_server/database";
import { readFloor } from "@/app/_server/floor";
import { handle } from "@/app/_server/handle";
import { taggedJson } from "@/app/_server/tagged-json";

/** The floor for the page's island; 304 while nobody has tapped since the last answer. */
export const GET = handle(
  { actor: "person", may: "floor.see" },
  async ({ actor, request, receivedAt }) => {
    const scope = { db: database(), siteId: actor.siteId };
    return taggedJson(request, await readFloor(scope, receivedAt));
  },
);
