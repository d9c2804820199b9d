import { z } from "zod";
import { cursor } from "@/lib/api/cursor";
import { filterName, page, pageLimit } from "@/lib/api/page";
import { afterSeq, formId, line, sought } from "@/lib/forms";
import { STANDARD_MAX_SECONDS, secondsOfMinutes } from "@/lib/standards/minutes";

const tooLong = `Give at most ${STANDARD_MAX_SECONDS / 3600} hours.`;
const seconds = z
  .int("Give whole seconds.")
  .min(0, "A standard is time that work takes: give 0 or more.")
  .max(STANDARD_MAX_SECONDS, tooLong);

/** Minutes in a form, as whole seconds. */
const minutes = z
  .string()
  .transform((text) => secondsOfMinutes(text) ?? Number.NaN)
  .pipe(seconds.or(z.nan().refine(() => false, "Give minutes, such as 12.5.")));

/** A reason is part of a standard for ever: who reads it later should find the why. */
const reason = line(300);

/** A standard to be set, as a program sends it. Without `option` it is the base. */
export const standardEntry = z.strictObject({
  model: filterName,
  operation: filterName,
  option: filterName.nullable().default(null),
  setupSeconds: seconds,
  runSeconds: seconds,
  effectiveFrom: z.iso.date("Give a date."),
  reason,
});
export type StandardEntry = z.infer<typeof standardEntry>;

/** The same from the form of the office, in minutes. */
export const standardForm = z.strictObject({
  id: formId,
  model: filterName,
  operation: filterName,
  option: z.string().transform((name) => name || null),
  setup: minutes,
  run: minutes,
  from: z.iso.date("Give a date."),
  reason,
});

/** What the address says of the page: model, stage, day, and the change that is drafted, if any. */
export const standardsQuery = z.object({
  model: sought(200),
  stage: sought(200),
  on: z.iso.date().catch(""),
  op: sought(40),
  option: sought(200),
  setup: sought(20),
  run: sought(20),
  from: sought(20),
  reason: sought(300),
  /** The id of the row that was just set, to say so. */
  set: sought(40),
});
export type StandardsQuery = z.infer<typeof standardsQuery>;

/** Which standards a program asks for. */
export const standardsListQuery = z.strictObject({
  model: filterName.optional(),
  operation: filterName.optional(),
  cursor: cursor(afterSeq).optional(),
  limit: pageLimit,
});

/** A standard as it was entered. Of two for one day the later in the list counts. */
export const standardItem = z.object({
  id: z.uuid(),
  model: z.string(),
  operation: z.string(),
  operationName: z.string(),
  option: z.string().nullable(),
  setupSeconds: z.int(),
  runSeconds: z.int(),
  effectiveFrom: z.iso.date(),
  reason: z.string(),
  enteredAt: z.string(),
});
export type StandardItem = z.infer<typeof standardItem>;

export const standardPage = page(standardItem);
