import type { z } from "zod";

/** What came of a request: the answer, a problem in the server's words, or nothing. */
export type Answer<T> =
  | { came: "answer"; value: T; etag: string | null }
  | { came: "unchanged" }
  | { came: "problem"; status: number; code: string; retryAfterSeconds: number | null }
  | { came: "nothing" };

export interface Question<T> {
  path: string;
  answer: z.ZodType<T>;
  body?: unknown;
  token?: string | null;
  etag?: string | null;
  timeoutMs?: number;
}

/** A request that takes longer is given up and asked again later. */
const TIMEOUT_MS = 15_000;

/**
 * Asks the server and checks what it says. A server that is away, that fails (5xx) or that answers
 * something unreadable is all one to the kiosk: nothing came, and it asks again.
 */
export async function ask<T>(question: Question<T>, fetcher: typeof fetch): Promise<Answer<T>> {
  let response: Response;
  try {
    response = await fetcher(question.path, requestOf(question));
    if (response.status === 304) return { came: "unchanged" };
    if (response.status >= 500) return { came: "nothing" };
    const json: unknown = await response.json();
    if (!response.ok) return problemOf(response, json);
    const parsed = question.answer.safeParse(json);
    if (!parsed.success) return { came: "nothing" };
    return { came: "answer", value: parsed.data, etag: response.headers.get("etag") };
  } catch {
    return { came: "nothing" };
  }
}

function requestOf<T>({ body, token, etag, timeoutMs }: Question<T>): RequestInit {
  return {
    method: body === undefined ? "GET" : "POST",
    credentials: "same-origin",
    cache: "no-store",
    signal: AbortSignal.timeout(timeoutMs ?? TIMEOUT_MS),
    headers: {
      accept: "application/json",
      ...(body === undefined ? {} : { "content-type": "application/json" }),
      ...(token ? { authorization: `Bearer ${token}` } : {}),
      ...(etag ? { "if-none-match": etag } : {}),
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  };
}

/** Reads an RFC 9457 answer; its `type` ends in our code. */
function problemOf(response: Response, json: unknown): Answer<never> {
  const type = json && typeof json === "object" && "type" in json ? String(json.type) : "";
  const seconds = Number(response.headers.get("retry-after") ?? "");
  return {
    came: "problem",
    status: response.status,
    code: type.split(":").at(-1) ?? "",
    retryAfterSeconds: seconds > 0 ? seconds : null,
  };
}
