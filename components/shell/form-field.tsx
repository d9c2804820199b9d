"use client";

import type { InputHTMLAttributes, ReactNode } from "react";
import type { Sent } from "@/components/shell/use-answer";
import { InputField, SelectField } from "@/components/ui/field";

interface FormFieldProps {
  sent: Pick<Sent<unknown>, "typed" | "errorOf">;
  name: string;
  label: string;
  hint?: string;
  /** What stands on file; what was typed before a no goes before it. */
  value?: string;
}

type InputProps = Omit<InputHTMLAttributes<HTMLInputElement>, "value" | "name" | "className">;

/** A line in a form of the office: it keeps what was typed and says what is wrong beneath. */
export function FormField({ sent, name, value, ...field }: FormFieldProps & InputProps) {
  return (
    <InputField
      {...field}
      name={name}
      error={sent.errorOf(name)}
      defaultValue={sent.typed(name) ?? value}
    />
  );
}

/** A choice from a list in a form of the office; its children are `option`s. */
export function FormSelect({
  sent,
  name,
  value,
  ...field
}: FormFieldProps & { children: ReactNode }) {
  const chosen = sent.typed(name) ?? value;
  // the key: a form's reset does not bring a select back to a new default
  return (
    <SelectField
      {...field}
      key={chosen}
      name={name}
      error={sent.errorOf(name)}
      defaultValue={chosen}
    />
  );
}
