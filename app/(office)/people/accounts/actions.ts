"use server";

import { act } from "@/app/_server/act";
import { hashPassword } from "@/app/_server/password";
import { drawSecret } from "@/app/_server/secret";
import { tryKeyOf } from "@/app/_server/sign-in";
import { findAccount } from "@/db/access/queries";
import {
  addAccount as addAccountRow,
  closeAccount as closeAccountRow,
  setPassword,
  setRoles,
} from "@/db/accounts/commands";
import { drawPassword } from "@/lib/access/issue";
import { accountChoice, accountForm, type GivenPassword, rolesForm } from "@/lib/access/schema";
import { no, ok } from "@/lib/result";

/** Adds an account; the answer shows its first password, once. */
export const addAccount = act(
  { may: "people.give-roles", form: accountForm },
  async ({ scope, input, by }) => {
    const password = drawPassword(drawSecret);
    const account = { ...input, passwordHash: await hashPassword(password) };
    const added = await addAccountRow(scope, account, { by, now: new Date() });
    if (!added.ok) return added;
    return ok<GivenPassword>({ name: input.name, email: input.email, password });
  },
);

/** Gives an account exactly these roles. */
export const changeRoles = act(
  { may: "people.give-roles", form: rolesForm },
  async ({ scope, input, by }) => setRoles(scope, input, { by, now: new Date() }),
);

/** Gives an account a new password, shown once; its sessions end. */
export const resetPassword = act(
  { may: "people.give-roles", form: accountChoice },
  async ({ scope, input, by }) => {
    const account = await findAccount(scope, input.account);
    if (!account) return no("notFound", "This account is not here any more.");
    const { id, name, email } = account;
    const password = drawPassword(drawSecret);
    const passwordHash = await hashPassword(password);
    const change = { id, passwordHash, tryKey: tryKeyOf(email) };
    const set = await setPassword(scope, change, { by, now: new Date() });
    return set.ok ? ok<GivenPassword>({ name, email, password }) : set;
  },
);

/** Closes an account: nobody signs in with it until it is opened again. */
export const closeAccount = act(
  { may: "people.give-roles", form: accountChoice },
  async ({ scope, input, by }) =>
    closeAccountRow(scope, { id: input.account, isClosed: true }, { by, now: new Date() }),
);

/** Opens a closed account again. */
export const openAccount = act(
  { may: "people.give-roles", form: accountChoice },
  async ({ scope, input, by }) =>
    closeAccountRow(scope, { id: input.account, isClosed: false }, { by, now: new Date() }),
);
