import Link from "next/link";
import { Head, Ledger } from "@/components/ui/table";
import type { Held } from "@/lib/access/may";

/** An account as the list shows it. */
export interface AccountRow {
  id: string;
  name: string;
  email: string;
  isClosed: boolean;
  held: readonly Held[];
}

/** The accounts of the office; each leads to its roles. */
export function AccountList({
  accounts,
  cells,
}: {
  accounts: readonly AccountRow[];
  cells: readonly { id: string; name: string }[];
}) {
  return (
    <Ledger caption="Accounts" className="desk-inset">
      <thead>
        <tr>
          <Head>Name, e-mail</Head>
          <Head>Roles</Head>
        </tr>
      </thead>
      <tbody>
        {accounts.map(({ id, name, email, isClosed, held }) => (
          <tr key={id}>
            <td className="py-1">
              <Link href={`/people/accounts/${id}`} className="font-[650]">
                {name}
              </Link>
              <span className="block text-t-2 text-ink-2 wrap-anywhere">{email}</span>
            </td>
            <td>{isClosed ? "closed" : rolesOf(held, cells)}</td>
          </tr>
        ))}
      </tbody>
    </Ledger>
  );
}

function rolesOf(held: readonly Held[], cells: readonly { id: string; name: string }[]): string {
  return held
    .map(({ role, cells: led }) => {
      const names = cells.filter(({ id }) => led.includes(id)).map(({ name }) => name);
      return names.length > 0 ? `${role} of ${names.join(", ")}` : role;
    })
    .join("; ");
}
