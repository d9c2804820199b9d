import type { Metadata } from "next";
import { personFor } from "@/app/_server/page-actor";
import { changePassword } from "@/app/(office)/account/actions";
import { PasswordChange } from "@/components/access/password-change";
import { roleWords } from "@/lib/access/role-words";

export const metadata: Metadata = { title: "Your account" };

/** Who the person is to Bookmatch, and their password. */
export default async function AccountPage() {
  const { person } = await personFor("account.change");
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">{person.name}</h1>
        <dl className="desk-facts">
          <dt>E-mail</dt>
          <dd>{person.email}</dd>
          <dt>Roles</dt>
          <dd>{roleWords(person.held)}</dd>
        </dl>
        <p className="text-ink-2">An admin changes name, e-mail and roles.</p>
      </section>
      <section>
        <h2 className="text-t-5">New password</h2>
        <PasswordChange action={changePassword} />
      </section>
    </div>
  );
}
