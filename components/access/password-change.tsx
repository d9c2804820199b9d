"use client";

import { FormField } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { PASSWORD_MIN } from "@/lib/access/password";

/** One's own password: the one now, and the new one. */
export function PasswordChange({ action }: { action: FormAction<unknown> }) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <FormField
        sent={sent}
        name="currentPassword"
        label="Password now"
        type="password"
        autoComplete="current-password"
        required
      />
      <FormField
        sent={sent}
        name="newPassword"
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_MIN} characters. A few words of your own do well.`}
        required
      />
      <FormFoot
        sent={sent}
        submit="Change password"
        done="Changed. Other browsers are signed out."
      />
    </form>
  );
}
