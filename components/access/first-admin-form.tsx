"use client";

import { FormField } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { PASSWORD_MIN } from "@/lib/access/password";

/** Who the first admin is. The token of the link goes along. */
export function FirstAdminForm({ action, token }: { action: FormAction<unknown>; token: string }) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="token" value={token} />
      <FormField sent={sent} name="name" label="Your name" autoComplete="name" required />
      <FormField
        sent={sent}
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        required
      />
      <FormField
        sent={sent}
        name="password"
        label="Password"
        type="password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_MIN} characters. A few words of your own do well.`}
        required
      />
      <FormFoot sent={sent} submit="Make me the admin" />
    </form>
  );
}
