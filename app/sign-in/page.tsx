import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { database } from "@/app/_server/database";
import { env } from "@/app/_server/env";
import { personOf } from "@/app/_server/person";
import { signIn } from "@/app/sign-in/actions";
import { SignInLeaves } from "@/app/sign-in/leaves";
import { DemoSignIns } from "@/components/access/demo-sign-ins";
import { SignInForm } from "@/components/access/sign-in-form";
import { findDemoSignIns } from "@/db/seed/sign-ins";
import { wayBack } from "@/lib/access/way-back";
import { groupBy } from "@/lib/group";

export const metadata: Metadata = { title: "Sign in" };

interface SignInProps {
  searchParams: Promise<{ to?: string | string[] }>;
}

/** The door of the office, which leads on to the page asked for. Someone who is in already goes on. */
export default async function SignInPage({ searchParams }: SignInProps) {
  const to = wayBack([(await searchParams).to].flat()[0] ?? "/");
  const person = await personOf();
  if (person.ok) redirect(to);
  return (
    <SignInLeaves book={await demoSignIns(to)}>
      <h1 className="text-t-6">Sign in to the office</h1>
      <SignInForm action={signIn} to={to} />
    </SignInLeaves>
  );
}

const WORKERS_SHOWN = 3;

/** The demo's sign-ins, one a role and a few of the cast; null where this is no demo. */
async function demoSignIns(to: string) {
  const demo = env().BOOKMATCH_DEMO === "1" ? await findDemoSignIns(database()) : null;
  if (!demo) return null;
  const first = groupBy(demo.office, ({ role }) => role);
  return (
    <DemoSignIns
      action={signIn}
      to={to}
      accounts={[...first.values()].map(([account]) => account!)}
      workers={demo.workers.slice(0, WORKERS_SHOWN)}
    />
  );
}
