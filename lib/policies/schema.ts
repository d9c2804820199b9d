import { z } from "zod";
import { chosen, dateField, formId, line } from "@/lib/forms";
import { policyOf } from "@/lib/pay/presets";
import { type PayPolicy, payPolicy, presetName } from "@/lib/pay/schema";

/** A name as it stands in files and beside hours. */
const policyName = z
  .string()
  .trim()
  .regex(/^[a-z][a-z0-9-]{1,39}$/, "Give a short name in small letters, digits and hyphens.");

/** A policy's rules as JSON: what is left out is as in every policy. Empty takes the preset named. */
const rules = z
  .string()
  .max(20_000, "At most 20,000 characters.")
  .transform((text, context): PayPolicy | null => {
    if (text.trim() === "") return null;
    const read = payPolicy.safeParse(jsonOf(text));
    if (read.success) return read.data;
    for (const { path, message } of read.error.issues) {
      const where = path.length > 0 ? `${path.join(".")}: ` : "";
      context.addIssue({ code: "custom", message: `${where}${message}` });
    }
    return z.NEVER;
  });

/** A new version of a policy: a preset by its name, or a site's own rules. */
export const policyForm = z
  .strictObject({
    name: policyName,
    rules,
    effectiveOn: dateField,
    reason: line(200),
    /** The version that it follows, 0 for none: sent twice it is refused the second time. */
    after: z.coerce.number().int().min(0),
  })
  .transform(({ name, rules: own, ...rest }, context) => {
    const preset = presetName.safeParse(name);
    const policy = own ?? (preset.success ? policyOf(preset.data) : null);
    if (policy) return { name, policy, ...rest };
    context.addIssue({
      code: "custom",
      path: ["rules"],
      message: `Give the rules as JSON, or name a preset: ${presetName.options.join(", ")}.`,
    });
    return z.NEVER;
  });
export type NewPolicy = z.output<typeof policyForm>;

/** By which policy the site, or one worker, is paid from a date on. */
export const choiceForm = z.strictObject({
  id: formId,
  /** A worker's number; empty for the whole site. */
  worker: z.union([
    z.literal(""),
    z
      .string()
      .trim()
      .regex(/^\d{1,8}$/, "Give the worker's number, digits only."),
  ]),
  /** Name of a policy; empty puts a worker back to the site's. */
  policy: z.union([z.literal(""), policyName]),
  effectiveOn: dateField,
  reason: line(200),
});

/** How the site parts its time into pay periods. */
export const rhythmForm = z.strictObject({
  id: formId,
  startsOn: dateField,
  days: z.coerce.number().int().min(1, "At least one day.").max(62, "At most 62 days."),
  reason: line(200),
});

/** Which closing is taken back, and why. */
export const reopenForm = z.strictObject({ period: chosen, reason: line(200) });

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return "not JSON"; // the schema then says that rules are an object
  }
}
