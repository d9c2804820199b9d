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
import { groupBy } from "@/lib/group";

export const metadata: Metadata = { title: "Sign in" };

/** The door of the office. Someone who is in already goes on. */
export default async function SignInPage() {
  const person = await personOf();
  if (person.ok) redirect("/");
  return (
    <SignInLeaves book={await demoSignIns()}>
      <h1 className="text-t-6">Sign in to the office</h1>
      <SignInForm action={signIn} />
    </SignInLeaves>
  );
}

const WORKERS_SHOWN = 3;

/** The demo's sign-ins, one a role and a few of the cast; null where this is no demo. */
async function demoSignIns() {
  const demo = env().BOOKMATCH_DEMO === "1" ? await findDemoSignIns(database()) : null;
  if (!demo) return null;
  const first = groupBy(demo.office, ({ role }) => role);
  return (
    <DemoSignIns
      action={signIn}
      accounts={[...first.values()].map(([account]) => account!)}
      workers={demo.workers.slice(0, WORKERS_SHOWN)}
    />
  );
}
