import { z } from "zod";

/** A date of the site's calendar, in years whose zone rules are known and can be reckoned with. */
export const siteDate = z.iso
  .date()
  .refine((text) => text >= "1970-01-08" && text < "2200", "Give a date from 1970 to 2199.");
