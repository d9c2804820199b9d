import { z } from "zod";
import { formId } from "@/lib/forms";

/** More days than the people of a large cell have in a period. */
const DAYS_MAX = 2000;

const SPELLED = /^(\d{1,8}) (\d{4}-\d{2}-\d{2}) ([0-9a-f]{64})$/;

/** One workday of a worker as a form names it: whose, which, and what it was when it was shown. */
export interface NamedDay {
  worker: string;
  date: string;
  digest: string;
}

/** Spells a day as a form sends it. */
export function spelledDay({ worker, date, digest }: NamedDay): string {
  return `${worker} ${date} ${digest}`;
}

const namedDay = z
  .string()
  .regex(SPELLED, "Load the page again.")
  .transform((text): NamedDay => {
    const [worker = "", date = "", digest = ""] = text.split(" ");
    return { worker, date, digest };
  });

/** The days that somebody agrees to. */
export const agreeForm = z.strictObject({
  id: formId,
  days: z.array(namedDay).min(1, "Choose at least one.").max(DAYS_MAX),
});
export type AgreeForm = z.infer<typeof agreeForm>;

/** Which period the cards are of, by its first day; anything odd counts as not said. */
export const agreementQuery = z.object({ period: z.iso.date().catch("") });
