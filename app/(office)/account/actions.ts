"use server";

import { act } from "@/app/_server/act";
import { database } from "@/app/_server/database";
import { hashPassword } from "@/app/_server/password";
import { enterOffice, proveAccount, tryKeyOf } from "@/app/_server/sign-in";
import { setPassword } from "@/db/accounts/commands";
import { passwordFault } from "@/lib/access/password";
import { passwordForm } from "@/lib/access/schema";
import { noField } from "@/lib/result";

/** Gives the person a new password; every other browser is signed out, this one stays. */
export const changePassword = act(
  { may: "account.change", form: passwordForm },
  async ({ person, scope, input, by }) => {
    const fault = passwordFault(input.newPassword, person.email);
    if (fault) return noField("newPassword", fault);
    const now = new Date();
    const known = { email: person.email, password: input.currentPassword, now };
    const proved = await proveAccount(database(), known);
    if (!proved.ok && proved.problem.code === "throttled") return proved;
    if (!proved.ok) return noField("currentPassword", "This is not your password now.");
    const passwordHash = await hashPassword(input.newPassword);
    const id = person.accountId;
    const account = { id, passwordHash, tryKey: tryKeyOf(person.email) };
    const changed = await setPassword(scope, account, { by, now });
    if (changed.ok) await enterOffice(id, now);
    return changed;
  },
);
