import { z } from "zod";

/** A line of text that must be there, without the spaces around it. */
export const line = (max: number) =>
  z.string().trim().min(1, "Fill this in.").max(max, `At most ${max} characters.`);

/** A line of text that may be left empty: null then. */
export const lineOrNone = (max: number) =>
  z
    .string()
    .trim()
    .max(max, `At most ${max} characters.`)
    .transform((text) => text || null);

/** The id of what a form makes, made with the form: sent twice it makes one thing. */
export const formId = z.uuid("Load the page again.");

/** One of the things a list offers, by its id. */
export const chosen = z.uuid("Choose one.");

/** A site date as a date field sends it. */
export const dateField = z.iso.date("Give a date.");

/** A site date that may be left empty: null then. */
export const dateOrNone = z.union([z.literal("").transform(() => null), dateField]);
