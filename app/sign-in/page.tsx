import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { env } from "@/app/_server/env";
import { personOf } from "@/app/_server/person";
import { signIn } from "@/app/sign-in/actions";
import { SignInLeaves } from "@/app/sign-in/leaves";
import { SignInForm } from "@/components/access/sign-in-form";

export const metadata: Metadata = { title: "Sign in" };

/** The door of the office. Someone who is in already goes on. */
export default async function SignInPage() {
  const person = await personOf();
  if (person.ok) redirect("/");
  return (
    <SignInLeaves book={env().BOOKMATCH_DEMO === "1" ? null : null}>
      <h1 className="text-t-6">Sign in to the office</h1>
      <SignInForm action={signIn} />
    </SignInLeaves>
  );
}
