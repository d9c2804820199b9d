import { z } from "zod";
import { role } from "@/lib/access/roles";
import { chosen, formId, line, sought } from "@/lib/forms";
import { workerNumber } from "@/lib/ledger/schema";

/** An e-mail as an account has it: small letters, no spaces around it. */
const email = z.string().trim().toLowerCase().max(254).pipe(z.email("Give an e-mail address."));

const password = z.string().min(1, "Fill this in.").max(1000);

/** `to` is the page that was asked for, whatever it is: `wayBack` judges it. */
export const signInForm = z.strictObject({ email, password, to: z.string().default("/") });

/** What the one-time link of an empty installation asks for. */
export const firstAdminForm = z.strictObject({
  token: z.string().min(1).max(200),
  name: line(80),
  email,
  password,
});

/** One's own new password. */
export const passwordForm = z.strictObject({ currentPassword: password, newPassword: password });

const roleFields = {
  /** Roles for the whole site; a lead's are the cells. */
  roles: z.array(role.exclude(["lead"])).default([]),
  /** The cells that the account leads. */
  cells: z.array(chosen).default([]),
  /** The number of the worker that the person is; empty for none. */
  worker: workerNumber.or(z.literal("")),
};

/** A new account of the office. */
export const accountForm = z.strictObject({ id: formId, name: line(80), email, ...roleFields });
export type AccountForm = z.infer<typeof accountForm>;

/** What an account may do from now on. */
export const rolesForm = z.strictObject({ account: formId, ...roleFields });
export type RolesForm = z.infer<typeof rolesForm>;

/** An account that is closed, opened again, or given a new password. */
export const accountChoice = z.strictObject({ account: formId });

/** Which accounts the list shows: part of a name or e-mail, and where the page before ended. */
export const accountsQuery = z.object({
  q: sought(80),
  after: z.uuid().or(z.literal("")).catch(""),
});

/** What is shown once: the password that the system made, and for whom. */
export interface GivenPassword {
  name: string;
  email: string;
  password: string;
}
