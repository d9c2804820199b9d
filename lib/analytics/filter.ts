import { z } from "zod";

const date = z.iso.date().catch("");
const name = z
  .string()
  .max(200)
  .refine((text) => !text.includes("\0"))
  .catch("");

/** By what an operation opens. */
export const openings = ["model", "options", "week", "ticket"] as const;
export type Opening = (typeof openings)[number];

/** What the address says of the comparison wanted; anything odd in it counts as not said. */
export const seamFilter = z.object({
  from: date,
  to: date,
  model: name,
  cell: name,
  stage: name,
  basis: z.enum(["matched", "booked"]).catch("matched"),
  /** The operation that is open, by what, and the ticket whose segments are. */
  open: name,
  by: z.enum(openings).catch("model"),
  ticket: name,
  /** Whether the unfinished tickets that are over their standard are listed. */
  over: z.enum(["", "1"]).catch(""),
});
export type SeamFilter = z.infer<typeof seamFilter>;

/** The same filter with some of it otherwise, as an address; what is as usual is left out. */
export function seamAddress(path: string, filter: SeamFilter, other: Partial<SeamFilter>): string {
  const pairs = Object.entries({ ...filter, ...other }).filter(
    ([key, value]) => value !== "" && value !== usual[key as keyof SeamFilter],
  );
  return pairs.length > 0 ? `${path}?${new URLSearchParams(pairs)}` : path;
}

const usual: Partial<SeamFilter> = { basis: "matched", by: "model" };
