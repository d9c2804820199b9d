import { z } from "zod";

/** POST /api/v1/calculate/check-code: any scanned or keyed text. */
export const checkCodeRequest = z.strictObject({ text: z.string().max(200) });

const codeKind = z.enum(["ticket", "badge", "carrier"]);
export type CodeKind = z.infer<typeof codeKind>;

/** What a scanned or keyed text turned out to be. */
export const codeReading = z.object({
  valid: z.boolean(),
  /** Null where the form is unknown. */
  kind: codeKind.nullable(),
  /**
   * Digits only: a ticket's with the check digit, as tickets are stored; a badge's and a carrier's
   * without it. Kept where only the check digit is wrong; null where the form is unknown.
   */
  number: z.string().nullable(),
  /** Absent where the code is valid. */
  problem: z.enum(["form", "check"]).optional(),
});
export type CodeReading = z.infer<typeof codeReading>;
