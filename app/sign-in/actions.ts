"use server";

import { redirect } from "next/navigation";
import { z } from "zod";
import { openAct } from "@/app/_server/act";
import { database } from "@/app/_server/database";
import { hashPassword } from "@/app/_server/password";
import { closeOffice, personOf } from "@/app/_server/person";
import { hashSecret } from "@/app/_server/secret";
import { enterOffice, proveAccount } from "@/app/_server/sign-in";
import { makeFirstAdmin, revokeSession } from "@/db/access/commands";
import { passwordFault } from "@/lib/access/password";
import { firstAdminForm, signInForm } from "@/lib/access/schema";
import { wayBack } from "@/lib/access/way-back";
import { noField } from "@/lib/result";

/** Opens the office to an e-mail and its password, at the page that was asked for. */
export const signIn = openAct(signInForm, async (input) => {
  const now = new Date();
  const proved = await proveAccount(database(), { ...input, now });
  if (!proved.ok) return proved;
  await enterOffice(proved.value.accountId, now);
  redirect(wayBack(input.to));
});

/** Makes the first admin from the one-time link of an empty installation, and lets them in. */
export const makeAdmin = openAct(firstAdminForm, async ({ token, name, email, password }) => {
  const fault = passwordFault(password, email);
  if (fault) return noField("password", fault);
  const now = new Date();
  const secrets = { tokenHash: hashSecret(token), passwordHash: await hashPassword(password) };
  const made = await makeFirstAdmin(database(), { name, email, now, ...secrets });
  if (!made.ok) return made;
  await enterOffice(made.value.accountId, now);
  redirect("/");
});

/** Ends this browser's session, on the server too. */
export const signOut = openAct(z.object({}), async () => {
  const person = await personOf();
  if (person.ok) await revokeSession(database(), person.value.sessionId, new Date());
  await closeOffice();
  redirect("/sign-in");
});
