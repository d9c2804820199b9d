"use client";

import { FormField, FormSelect } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { TextField } from "@/components/ui/field";

/** Adds a version of a policy: a preset by its name, or a site's own rules as JSON. */
export function PolicyForm({
  action,
  presets,
  latest,
}: {
  action: FormAction<unknown>;
  presets: readonly string[];
  /** How many versions each policy has. */
  latest: Record<string, number>;
}) {
  const sent = useAnswer(action);
  const name = sent.typed("name") ?? "";
  return (
    <form
      action={(form) => {
        form.set("after", String(latest[String(form.get("name"))] ?? 0));
        sent.send(form);
      }}
      className="desk-form"
    >
      <FormField
        sent={sent}
        name="name"
        label="Name"
        hint={`Known without rules of your own: ${presets.join(", ")}.`}
        value={name}
        required
      />
      <TextField
        name="rules"
        label="Rules as JSON"
        hint="Empty takes the preset of that name. What is left out is as in every policy."
        error={sent.errorOf("rules")}
        defaultValue={sent.typed("rules")}
        rows={6}
        spellCheck={false}
      />
      <FormField
        sent={sent}
        name="effectiveOn"
        label="For workweeks that begin on or after"
        type="date"
        required
      />
      <FormField sent={sent} name="reason" label="Reason" required />
      <FormFoot sent={sent} submit="Add the version" done="Added." />
    </form>
  );
}

/** Puts the site or one worker under a policy from a day on. */
export function ChoiceForm({
  action,
  id,
  policies,
}: {
  action: FormAction<unknown>;
  id: string;
  policies: readonly string[];
}) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="id" value={id} />
      <FormField
        sent={sent}
        name="worker"
        label="Worker's number"
        hint="Empty for the whole site."
        inputMode="numeric"
      />
      <FormSelect sent={sent} name="policy" label="Policy" value={policies[0] ?? ""}>
        {policies.map((policy) => (
          <option key={policy} value={policy}>
            {policy}
          </option>
        ))}
        <option value="">as the site</option>
      </FormSelect>
      <FormField
        sent={sent}
        name="effectiveOn"
        label="For workweeks that begin on or after"
        type="date"
        required
      />
      <FormField sent={sent} name="reason" label="Reason" required />
      <FormFoot sent={sent} submit="Choose it" done="Chosen." />
    </form>
  );
}

/** Says how the site parts its time into pay periods. */
export function RhythmForm({
  action,
  id,
  rhythm,
}: {
  action: FormAction<unknown>;
  id: string;
  rhythm: { startsOn: string; days: number } | null;
}) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="id" value={id} />
      <FormField
        sent={sent}
        name="startsOn"
        label="First day of a period"
        type="date"
        value={rhythm?.startsOn ?? ""}
        required
      />
      <FormField
        sent={sent}
        name="days"
        label="Days in a period"
        inputMode="numeric"
        value={String(rhythm?.days ?? 14)}
        required
      />
      <FormField sent={sent} name="reason" label="Reason" required />
      <FormFoot sent={sent} submit="Set the periods" done="Set." />
    </form>
  );
}
