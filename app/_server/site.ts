import "server-only";
import { cache } from "react";
import { database } from "@/app/_server/database";
import { findSite, type Site } from "@/db/sites/queries";
import { assert } from "@/lib/assert";

/** The site that someone works at, with its rules; within one request it is read once. */
export const siteOf = cache(async (siteId: string): Promise<Site> => {
  const site = await findSite({ db: database(), siteId });
  assert(site !== null && site.rules.length > 0, "siteOf: every site has a row of rules");
  return site;
});
