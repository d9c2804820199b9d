import type { Result } from "@/lib/result";

/**
 * What a form shows after it was sent: the command's result, and what was typed (passwords and PINs
 * left out), so that a no costs nobody their typing. Null before the first time.
 */
export type Answer<V> = { result: Result<V>; typed: Typed } | null;

/** The fields of a form as they were sent; a field named `cells[]` is a list named `cells`. */
export type Typed = Record<string, string | string[]>;

/**
 * Gathers the fields of a form. Names that end in `[]` become lists, of a repeated name the last
 * counts, files and the framework's own fields (`$…`) are left out.
 */
export function typedOf(entries: Iterable<[string, unknown]>): Typed {
  const typed: Typed = {};
  for (const [name, value] of entries) {
    if (typeof value !== "string" || name.startsWith("$")) continue;
    if (!name.endsWith("[]")) typed[name] = value;
    else typed[name.slice(0, -2)] = [typed[name.slice(0, -2)] ?? [], value].flat();
  }
  return typed;
}

const SECRETS = /password|pin|token/i;

/** The typed fields that may travel back to the screen: everything but secrets. */
export function shownAgain(typed: Typed): Typed {
  return Object.fromEntries(Object.entries(typed).filter(([name]) => !SECRETS.test(name)));
}
