"use client";

import { PasswordShown } from "@/components/people/password-shown";
import { RoleFields } from "@/components/people/role-fields";
import { FormField } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import type { GivenPassword } from "@/lib/access/schema";

/** Adds an account; in its place the first password is shown, once. */
export function NewAccount({
  action,
  id,
  cells,
}: {
  action: FormAction<GivenPassword>;
  id: string;
  cells: readonly { id: string; name: string }[];
}) {
  const sent = useAnswer(action);
  if (sent.value) return <PasswordShown given={sent.value} />;
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="id" value={id} />
      <FormField sent={sent} name="name" label="Name" required />
      <FormField sent={sent} name="email" label="E-mail" type="email" required />
      <RoleFields sent={sent} held={[]} cells={cells} worker="" />
      <FormFoot sent={sent} submit="Add and show the password" />
    </form>
  );
}
