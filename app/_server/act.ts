import "server-only";
import { randomUUID } from "node:crypto";
import { refresh } from "next/cache";
import { unstable_rethrow } from "next/navigation";
import type { z } from "zod";
import { log } from "@/app/_server/log";
import { type Visit, visitFor } from "@/app/_server/page-actor";
import { check } from "@/app/_server/read-body";
import type { Action } from "@/lib/access/may";
import { type Answer, shownAgain, type Typed, typedOf } from "@/lib/answer";
import { no, type Result } from "@/lib/result";

/** What a form of the office may do and what it takes. */
export interface Deed<I> {
  may: Action;
  form: z.ZodType<I>;
}

export interface DeedCall<I> extends Visit {
  input: I;
  /** Who it is in the audit log. */
  by: string;
}

/** A server action as `useActionState` calls it. */
export type FormAction<V> = (before: unknown, form: FormData) => Promise<Answer<V>>;

/**
 * Wraps a server action as `handle` wraps a route: person, then permission, then the form, then
 * `run`. A no comes back to the form in plain words; after a yes the page is drawn afresh in the
 * same answer.
 */
export function act<I, V>(
  deed: Deed<I>,
  run: (call: DeedCall<I>) => Promise<Result<V>>,
): FormAction<V> {
  return answering(async (typed) => {
    const visit = await visitFor(deed.may);
    if (!visit.ok) return visit;
    const input = check(typed, deed.form);
    if (!input.ok) return input;
    const by = `account:${visit.value.person.accountId}`;
    const result = await run({ ...visit.value, input: input.value, by });
    if (result.ok) refresh();
    return result;
  });
}

/** Wraps the few server actions that nobody need be signed in for: signing in and out. */
export function openAct<I, V>(
  form: z.ZodType<I>,
  run: (input: I) => Promise<Result<V>>,
): FormAction<V> {
  return answering(async (typed) => {
    const input = check(typed, form);
    return input.ok ? run(input.value) : input;
  });
}

/** Catches what nobody expected, and gives the form back what was typed. */
function answering<V>(run: (typed: Typed) => Promise<Result<V>>): FormAction<V> {
  return async (_before, form) => {
    const typed = typedOf(form);
    try {
      return { result: await run(typed), typed: shownAgain(typed) };
    } catch (error) {
      unstable_rethrow(error);
      const reference = randomUUID().slice(0, 8);
      log().error({ reference, err: error }, "fault");
      const detail = `Something went wrong on our side (ref ${reference}). Try again in a moment.`;
      return { result: no("unavailable", detail), typed: shownAgain(typed) };
    }
  };
}
