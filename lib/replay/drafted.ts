import { type ChangeFacts, decideChange } from "@/lib/replay/decide-change";
import { type StandardEntry, type StandardsQuery, standardForm } from "@/lib/standards/schema";

/** A change as it stands in the address: one that may be set, or what is wrong with it. */
export interface Drafted {
  entry: StandardEntry | null;
  /** By the name of the field in the form. */
  errors: Partial<Record<FormFieldName, string>>;
}

type FormFieldName = "setup" | "run" | "from" | "reason";

/** The fields of the form by their names in the contract. */
const fields: Record<string, FormFieldName> = {
  setupSeconds: "setup",
  runSeconds: "run",
  effectiveFrom: "from",
};

const figures = standardForm.omit({ id: true });

/**
 * Reads the change that the address says, and judges it as setting it will. Null where none is
 * drafted: no figure and no day is said.
 */
export function draftedOf(
  { model, op, option, setup, run, from, reason }: StandardsQuery,
  facts: ChangeFacts,
): Drafted | null {
  if (!setup && !run && !from) return null;
  const read = figures.safeParse({ model, operation: op, option, setup, run, from, reason });
  if (!read.success) return { entry: null, errors: errorsOf(read.error.issues) };
  const entry = entryOf(read.data);
  const decided = decideChange(entry, facts);
  if (decided.ok) return { entry, errors: {} };
  return { entry: null, errors: errorsOf(decided.problem.errors ?? []) };
}

/** A form's change in the terms of the contract. */
export function entryOf({
  setup,
  run,
  from,
  ...rest
}: ReturnType<typeof figures.parse>): StandardEntry {
  return { ...rest, setupSeconds: setup, runSeconds: run, effectiveFrom: from };
}

/** What a refusal says, field by field of the form. */
export function formErrors<T extends { path: string; message: string }>(errors: readonly T[]): T[] {
  return errors.map((error) => ({ ...error, path: fields[error.path] ?? error.path }));
}

function errorsOf(issues: readonly { path: PropertyKey[] | string; message: string }[]) {
  const named = issues.map(({ path, message }) => {
    return { path: String([path].flat()[0] ?? ""), message };
  });
  return Object.fromEntries(formErrors(named).map(({ path, message }) => [path, message]));
}
