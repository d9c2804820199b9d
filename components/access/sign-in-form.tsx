"use client";

import { FormField } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";

/** E-mail and password; pasting and password managers work. */
export function SignInForm({
  action,
  to,
}: {
  action: FormAction<unknown>;
  /** The page to go on to. */
  to: string;
}) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="to" value={to} />
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
        autoComplete="current-password"
        required
      />
      <FormFoot sent={sent} submit="Sign in" />
    </form>
  );
}
