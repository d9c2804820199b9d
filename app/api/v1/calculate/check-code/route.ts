import { handle } from "@/app/_server/handle";
import { readCode } from "@/lib/codes/read-code";
import { checkCodeRequest } from "@/lib/codes/schema";
import { ok } from "@/lib/result";

/** Reads a scanned or keyed text. A misread is an answer, not a refusal. */
export const POST = handle(
  { actor: "key", may: "calculate", body: checkCodeRequest },
  async ({ body }) => ok(readCode(body.text)),
);
