import { v5 as uuidv5, v7 as uuidv7 } from "uuid";
import { database } from "@/app/_server/database";
import { handle } from "@/app/_server/handle";
import { siteOf } from "@/app/_server/site";
import { setStandard } from "@/db/standards/commands";
import { listStandardEntries } from "@/db/standards/entries";
import { pageOf } from "@/lib/api/page";
import { no, ok } from "@/lib/result";
import { standardItemOf } from "@/lib/standards/item";
import { standardEntry, standardsListQuery } from "@/lib/standards/schema";

/** Longer keys than any program needs to tell its requests apart. */
const KEY_MAX = 200;

/** Lists every standard ever entered, page by page in the order of entry. */
export const GET = handle(
  { actor: "key", may: "standards.read", query: standardsListQuery },
  async ({ actor, query }) => {
    const { cursor: after, limit, ...filters } = query;
    const scope = { db: database(), siteId: actor.siteId };
    const rows = await listStandardEntries(scope, { ...filters, after, limit: limit + 1 });
    const { items, nextCursor } = pageOf(rows, limit, ({ seq }) => seq);
    return ok({ items: items.map(standardItemOf), nextCursor });
  },
);

/**
 * Sets a standard from a day on. A row's id is made from the key and its `Idempotency-Key`, so the
 * same request again is the same row, for ever.
 */
export const POST = handle(
  { actor: "key", may: "standards.set", body: standardEntry },
  async ({ actor, body, request, receivedAt: now }) => {
    const { siteId, keyId } = actor;
    const given = request.headers.get("idempotency-key");
    if (given !== null && (given.length === 0 || given.length > KEY_MAX)) {
      const message = `Give 1 to ${KEY_MAX} characters.`;
      return no("invalid", message, { errors: [{ path: "Idempotency-Key", message }] });
    }
    const id = given === null ? uuidv7() : uuidv5(`${keyId} standards ${given}`, siteId);
    const { rules } = await siteOf(siteId);
    const scope = { db: database(), siteId };
    return setStandard(scope, { id, ...body }, { by: `key:${keyId}`, now, rules });
  },
);
