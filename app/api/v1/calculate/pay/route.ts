import { handle } from "@/app/_server/handle";
import { payRequest } from "@/lib/pay/request";
import { payStatement } from "@/lib/pay/statement";
import { ok } from "@/lib/result";

/** States what time comes to under a pay policy; nothing is kept. */
export const POST = handle(
  { actor: "key", may: "calculate.pay", body: payRequest },
  async ({ body }) => ok(payStatement(body)),
);
