"use client";

import { PasswordShown } from "@/components/people/password-shown";
import { RoleFields } from "@/components/people/role-fields";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import type { Held } from "@/lib/access/may";
import type { GivenPassword } from "@/lib/access/schema";

interface ActProps<V> {
  action: FormAction<V>;
  account: string;
}

/** Changes what an account may do, from the next request on. */
export function RolesChange({
  action,
  account,
  ...fields
}: ActProps<unknown> & {
  held: readonly Held[];
  cells: readonly { id: string; name: string }[];
  worker: string;
}) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="account" value={account} />
      <RoleFields sent={sent} {...fields} />
      <FormFoot sent={sent} submit="Keep the roles" done="Kept." />
    </form>
  );
}

/** Gives an account another password and shows it once; its sessions end. */
export function PasswordReset({ action, account }: ActProps<GivenPassword>) {
  const sent = useAnswer(action);
  if (sent.value) return <PasswordShown given={sent.value} />;
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="account" value={account} />
      <p>The old password ends at once, and so do its sessions.</p>
      <FormFoot sent={sent} submit="Give a new password" tone="plain" />
    </form>
  );
}

/** Closes an account, or opens a closed one. */
export function ClosingAct({
  action,
  account,
  isClosed,
}: ActProps<unknown> & { isClosed: boolean }) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="account" value={account} />
      <p>
        {isClosed
          ? "Nobody signs in with it now."
          : "Nobody signs in with a closed account; what it did stays on record."}
      </p>
      <FormFoot
        sent={sent}
        submit={isClosed ? "Open the account again" : "Close the account"}
        tone={isClosed ? "plain" : "danger"}
      />
    </form>
  );
}
