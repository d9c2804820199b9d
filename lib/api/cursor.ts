import { z } from "zod";

/** The longest cursor that is read at all; ours are far shorter. */
const CURSOR_MAX = 512;

/**
 * Spells a position in a list as an opaque cursor: base64url of JSON. It carries where the page
 * before ended, nothing secret, and is read back by `cursor` with the same shape.
 */
export function cursorOf(position: unknown): string {
  const bytes = new TextEncoder().encode(JSON.stringify(position));
  const base64 = btoa(String.fromCharCode(...bytes));
  return base64.replaceAll("+", "-").replaceAll("/", "_").replaceAll("=", "");
}

/**
 * The schema of a `cursor` parameter: reads what `cursorOf` spelled, checked against the shape of
 * the list's position, so that a damaged or invented cursor is refused and never reaches a query.
 */
export function cursor<T>(position: z.ZodType<T>) {
  return z
    .string()
    .max(CURSOR_MAX)
    .transform((text, context): T => {
      const read = position.safeParse(decoded(text));
      if (read.success) return read.data;
      context.addIssue("Take the cursor from `nextCursor`, or leave it out for the first page.");
      return z.NEVER;
    });
}

/** What a cursor's text holds; undefined where it is not one. */
function decoded(text: string): unknown {
  try {
    const base64 = text.replaceAll("-", "+").replaceAll("_", "/");
    const bytes = Uint8Array.from(atob(base64), (char) => char.charCodeAt(0));
    return JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes));
  } catch {
    return undefined;
  }
}
