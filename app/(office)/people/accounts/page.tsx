import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { personFor } from "@/app/_server/page-actor";
import { addAccount } from "@/app/(office)/people/accounts/actions";
import { AccountFinder } from "@/components/people/account-finder";
import { AccountList } from "@/components/people/account-list";
import { NewAccount } from "@/components/people/new-account";
import { NextPage } from "@/components/shell/next-page";
import { listAccounts } from "@/db/access/queries";
import { listCells } from "@/db/cells/queries";
import { accountsQuery } from "@/lib/access/schema";

export const metadata: Metadata = { title: "Accounts and roles" };

const PAGE = 50;

interface AccountsProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Who may sign in to the office, and as what. */
export default async function AccountsPage({ searchParams }: AccountsProps) {
  const { scope } = await personFor("people.give-roles");
  const query = accountsQuery.parse(await searchParams);
  const [found, cells] = await Promise.all([
    listAccounts(scope, query.q, { after: query.after || null, limit: PAGE + 1 }),
    listCells(scope),
  ]);
  const accounts = found.slice(0, PAGE);
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">Accounts</h1>
        <AccountFinder text={query.q} />
        {accounts.length > 0 ? (
          <AccountList accounts={accounts} cells={cells} />
        ) : (
          <p className="mt-4">No account has {query.q} in its name or e-mail.</p>
        )}
        {found.length > PAGE && (
          <NextPage path="/people/accounts" query={{ q: query.q }} after={accounts.at(-1)!.id} />
        )}
      </section>
      <section>
        <h2 className="text-t-5">A new account</h2>
        <NewAccount action={addAccount} id={uuidv7()} cells={cells} />
      </section>
    </div>
  );
}
