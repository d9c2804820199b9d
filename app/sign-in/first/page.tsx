import type { Metadata } from "next";
import { database } from "@/app/_server/database";
import { hashSecret } from "@/app/_server/secret";
import { makeAdmin } from "@/app/sign-in/actions";
import { SignInLeaves } from "@/app/sign-in/leaves";
import { FirstAdminForm } from "@/components/access/first-admin-form";
import { findSetupLink } from "@/db/access/queries";

export const metadata: Metadata = { title: "First admin", referrer: "no-referrer" };

interface FirstProps {
  searchParams: Promise<{ token?: string | string[] }>;
}

/** Where the one-time link of an empty installation leads. */
export default async function FirstAdminPage({ searchParams }: FirstProps) {
  const token = [(await searchParams).token].flat()[0] ?? "";
  const link = await findSetupLink(database(), hashSecret(token), new Date());
  return (
    <SignInLeaves book={link && <FirstSteps />}>
      {link ? (
        <>
          <h1 className="text-t-6">The first admin</h1>
          <FirstAdminForm action={makeAdmin} token={token} />
        </>
      ) : (
        <>
          <h1 className="text-t-6">This link opens nothing</h1>
          <p>It was used, or its day is over. Start Bookmatch again for a new one.</p>
          <a href="/sign-in" className="button justify-self-start" data-rim="right">
            Sign in
          </a>
        </>
      )}
    </SignInLeaves>
  );
}

function FirstSteps() {
  return (
    <>
      <h2 className="mb-3 text-t-5">What comes next</h2>
      <ol>
        <li>Add the people of the bench, each with a PIN.</li>
        <li>Make a code for each tablet and key it there.</li>
        <li>Give the office its accounts and roles.</li>
      </ol>
    </>
  );
}
