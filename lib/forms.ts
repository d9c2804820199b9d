import { z } from "zod";

/** Text that a database can keep: without NUL and halves of characters. */
const storable = (text: string) => !text.includes("\0") && !/\p{Surrogate}/u.test(text);
const UNSTORABLE = "Leave out the signs that cannot be seen.";

/** A line of text that must be there, without the spaces around it. */
export const line = (max: number) =>
  z
    .string()
    .trim()
    .min(1, "Fill this in.")
    .max(max, `At most ${max} characters.`)
    .refine(storable, UNSTORABLE);

/** A line of text that may be left empty: null then. */
export const lineOrNone = (max: number) =>
  z
    .string()
    .trim()
    .max(max, `At most ${max} characters.`)
    .refine(storable, UNSTORABLE)
    .transform((text) => text || null);

/** What an address says to look for; anything odd in it counts as not said. */
export const sought = (max: number) => z.string().trim().max(max).refine(storable).catch("");

/** The number after which the next page of a list begins, as far as the database counts. */
export const afterSeq = z.coerce.number().int().min(1).max(2_147_483_647);

/** The id of what a form makes, made with the form: sent twice it makes one thing. */
export const formId = z.uuid("Load the page again.");

/** One of the things a list offers, by its id. */
export const chosen = z.uuid("Choose one.");

/** A site date as a date field sends it. */
export const dateField = z.iso.date("Give a date.");

/** A site date that may be left empty: null then. */
export const dateOrNone = z.union([z.literal("").transform(() => null), dateField]);
