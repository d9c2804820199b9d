import { handle } from "@/app/_server/handle";
import { splitRequest } from "@/lib/api/split";
import { ok } from "@/lib/result";
import { split } from "@/lib/timeline/split";

/** Shares seconds by weight as the ledger does. The schema refuses all that `split` would. */
export const POST = handle(
  { actor: "key", may: "calculate", body: splitRequest },
  async ({ body }) => ok({ parts: split(body.seconds, body.weights) }),
);
