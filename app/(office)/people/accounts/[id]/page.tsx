import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { z } from "zod";
import { personFor } from "@/app/_server/page-actor";
import {
  changeRoles,
  closeAccount,
  openAccount,
  resetPassword,
} from "@/app/(office)/people/accounts/actions";
import { ClosingAct, PasswordReset, RolesChange } from "@/components/people/account-acts";
import { findAccount } from "@/db/access/queries";
import { listCells } from "@/db/cells/queries";
import { roleWords } from "@/lib/access/role-words";

export const metadata: Metadata = { title: "Account" };

interface AccountProps {
  params: Promise<{ id: string }>;
}

/** One account: who it is on the left, what it may do on the right. */
export default async function AccountRolesPage({ params }: AccountProps) {
  const { scope } = await personFor("people.give-roles");
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) notFound();
  const [account, cells] = await Promise.all([findAccount(scope, id.data), listCells(scope)]);
  if (!account) notFound();
  const { isClosed, held, worker } = account;
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">{account.name}</h1>
        <dl className="desk-facts">
          <dt>E-mail</dt>
          <dd>{account.email}</dd>
          <dt>Roles</dt>
          <dd>{isClosed ? "closed" : roleWords(held)}</dd>
          <dt>Is the worker</dt>
          <dd>{worker ? <Link href={`/people/${worker}`}>{worker}</Link> : "nobody"}</dd>
        </dl>
        <p>
          <Link href="/people/accounts" className="button" data-rim="left">
            All accounts
          </Link>
        </p>
      </section>
      <section className="grid content-start gap-8">
        <div>
          <h2 className="text-t-5">Roles</h2>
          <RolesChange
            action={changeRoles}
            account={account.id}
            held={held}
            cells={cells}
            worker={worker ?? ""}
          />
        </div>
        <div>
          <h2 className="text-t-5">Password</h2>
          <PasswordReset action={resetPassword} account={account.id} />
        </div>
        <div>
          <h2 className="text-t-5">{isClosed ? "Closed" : "Close"}</h2>
          <ClosingAct
            action={isClosed ? openAccount : closeAccount}
            account={account.id}
            isClosed={isClosed}
          />
        </div>
      </section>
    </div>
  );
}
