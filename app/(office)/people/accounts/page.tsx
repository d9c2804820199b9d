import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { personFor } from "@/app/_server/page-actor";
import { addAccount } from "@/app/(office)/people/accounts/actions";
import { AccountList } from "@/components/people/account-list";
import { NewAccount } from "@/components/people/new-account";
import { listAccounts } from "@/db/access/queries";
import { listCells } from "@/db/cells/queries";

export const metadata: Metadata = { title: "Accounts and roles" };

/** Sites of 2,500 people have some hundred accounts; more would want pages. */
const ACCOUNTS_MAX = 1000;

/** Who may sign in to the office, and as what. */
export default async function AccountsPage() {
  const { scope } = await personFor("people.give-roles");
  const [accounts, cells] = await Promise.all([
    listAccounts(scope, ACCOUNTS_MAX),
    listCells(scope),
  ]);
  return (
    <div className="desk-pair">
      <section>
        <h1 className="text-t-6">Accounts</h1>
        <AccountList accounts={accounts} cells={cells} />
      </section>
      <section>
        <h2 className="text-t-5">A new account</h2>
        <NewAccount action={addAccount} id={uuidv7()} cells={cells} />
      </section>
    </div>
  );
}
