import { z } from "zod";
import { localTime } from "@/lib/ends/schema";
import { dateField, formId, line } from "@/lib/forms";

/** Which week the own page shows, by any date in it; anything odd counts as not said. */
export const meQuery = z.object({ week: z.iso.date().catch(""), day: z.iso.date().catch("") });

/** What somebody says is wrong with their own time. */
export const objectForm = z.strictObject({
  id: formId,
  /** The workday that it is about. */
  date: dateField,
  message: line(500),
});

/** The own answer to when a shift ended. */
export const leftForm = z.strictObject({
  id: formId,
  subject: z.uuid("Load the page again."),
  time: localTime.refine((text) => text !== "", "Give the time."),
});
