"use client";

import { useActionState } from "react";
import type { Answer } from "@/lib/answer";
import type { Problem } from "@/lib/result";

/** A form's server action, as `act` makes it. */
export type FormAction<V> = (before: unknown, form: FormData) => Promise<Answer<V>>;

/** What a form knows of its last sending. */
export interface Sent<V> {
  /** For the form's `action`. */
  send: (form: FormData) => void;
  isSending: boolean;
  /** What a yes gave; null before, and after a no. */
  value: V | null;
  isDone: boolean;
  problem: Problem | null;
  /** What was typed into a field before a no, so that nothing is typed twice. */
  typed: (name: string) => string | undefined;
  typedList: (name: string) => readonly string[] | undefined;
  /** What is wrong with a field, in words. */
  errorOf: (name: string) => string | undefined;
}

/** Sends a form to its action and says what came back; without JavaScript the form works as well. */
export function useAnswer<V>(action: FormAction<V>): Sent<V> {
  const [answer, send, isSending] = useActionState<Answer<V>, FormData>(action, null);
  const result = answer?.result ?? null;
  const problem = result && !result.ok ? result.problem : null;
  const typed = problem ? answer?.typed : undefined;
  return {
    send,
    isSending,
    problem,
    isDone: result?.ok ?? false,
    value: result?.ok ? result.value : null,
    typed: (name) => [typed?.[name]].flat()[0],
    typedList: (name) => (typed ? [typed[name] ?? []].flat() : undefined),
    errorOf: (name) => problem?.errors?.find(({ path }) => path.split(".")[0] === name)?.message,
  };
}
