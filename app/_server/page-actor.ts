import "server-only";
import { headers } from "next/headers";
import { forbidden, redirect } from "next/navigation";
import type { PersonActor } from "@/app/_server/actor";
import { ASKED_FOR } from "@/app/_server/asked-for";
import { database } from "@/app/_server/database";
import { personOf } from "@/app/_server/person";
import type { Scope } from "@/db/client";
import { type Action, cellsOf, type Reach, reachOf } from "@/lib/access/may";
import { signInFor } from "@/lib/access/way-back";
import { no, ok, type Result } from "@/lib/result";

/** Who asks for a page, where they work, and how far the page's action reaches for them. */
export interface Visit {
  person: PersonActor;
  scope: Scope;
  reach: Reach;
  /** The cells that reach `cells` means; null where it is the whole site. */
  cells: string[] | null;
}

/**
 * Asks for the person behind a page. Each page of the office calls it first and names its action;
 * someone not signed in is sent to sign in and comes back, someone whose role does not open it is told so (403).
 */
export async function personFor(action: Action): Promise<Visit> {
  const visit = await visitFor(action);
  if (!visit.ok) forbidden();
  return visit.value;
}

/** The same for a form: the no is the answer. Someone not signed in is sent to sign in. */
export async function visitFor(action: Action): Promise<Result<Visit>> {
  const found = await personOf();
  if (!found.ok && found.problem.code === "unauthenticated")
    redirect(signInFor((await headers()).get(ASKED_FOR) ?? "/"));
  if (!found.ok) return found;
  const person = found.value;
  const reach = reachOf(person.held, action);
  if (!reach) return no("forbidden", "Your role does not open this. Ask an admin if it should.");
  const scope = { db: database(), siteId: person.siteId };
  return ok({ person, scope, reach, cells: reach === "cells" ? cellsOf(person.held) : null });
}
