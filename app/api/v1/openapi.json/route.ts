import { handle } from "@/app/_server/handle";
import { openApi } from "@/lib/api/openapi";
import { ok } from "@/lib/result";

/** Describes the HTTP contract. It holds no secret, so it needs no key. */
export const GET = handle({ actor: "nobody" }, async () => ok(openApi()));
