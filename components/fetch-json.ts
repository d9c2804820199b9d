import type { z } from "zod";

/** A server that answered no, or not at all, with a sentence for the person who waits. */
export class ProblemError extends Error {
  /** The HTTP status; 0 where nothing came back. */
  readonly status: number;

  constructor(status: number, detail: string) {
    super(detail);
    this.name = "ProblemError";
    this.status = status;
  }
}

/**
 * Reads JSON for SWR: checks the status and the schema. The browser itself asks with the `ETag` it
 * has, so that an unchanged answer costs a 304.
 *
 * @throws ProblemError with the problem's `detail`, or a sentence where there is none
 */
export async function fetchJson<T>(url: string, schema: z.ZodType<T>): Promise<T> {
  const response = await fetch(url, { headers: { accept: "application/json" } }).catch(() => null);
  if (!response) throw new ProblemError(0, "Bookmatch does not answer just now.");
  const body: unknown = await response.json().catch(() => null);
  if (!response.ok) throw new ProblemError(response.status, detailOf(body));
  return schema.parse(body);
}

function detailOf(body: unknown): string {
  const detail = body && typeof body === "object" && "detail" in body ? body.detail : null;
  return typeof detail === "string" ? detail : "Bookmatch could not answer just now.";
}
