import { z } from "zod";

/** RFC 9457, as every refusal is answered; `errors` names the fields of invalid input. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});
