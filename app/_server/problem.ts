import "server-only";
import type { Problem, ProblemCode } from "@/lib/result";

const statuses = {
  badJson: 400,
  invalid: 422,
  unauthenticated: 401,
  forbidden: 403,
  notFound: 404,
  conflict: 409,
  gone: 410,
  tooLarge: 413,
  throttled: 429,
  unavailable: 503,
} as const satisfies Record<ProblemCode, number>;

const titles = {
  badJson: "Not JSON",
  invalid: "Something in the request cannot be taken",
  unauthenticated: "Sign in first",
  forbidden: "Not yours to do",
  notFound: "Not found here",
  conflict: "Something else came first",
  gone: "No longer kept",
  tooLarge: "Too large",
  throttled: "Wait a moment",
  unavailable: "Not available just now",
} as const satisfies Record<ProblemCode, string>;

/** The one place where a problem meets a status: an RFC 9457 answer. */
export function problemResponse(problem: Problem): Response {
  const { code, detail, errors, retryAfterSeconds } = problem;
  const status = statuses[code];
  const body = {
    type: `urn:bookmatch:problem:${code}`,
    title: titles[code],
    status,
    detail,
    errors,
  };
  return Response.json(body, {
    status,
    headers: {
      "content-type": "application/problem+json",
      "cache-control": "no-store",
      ...(retryAfterSeconds === undefined ? {} : { "retry-after": String(retryAfterSeconds) }),
      ...(code === "unauthenticated" ? { "www-authenticate": "Bearer" } : {}),
    },
  });
}

/** Our own mistake or the machine's: logged with `reference`, answered without a word of how. */
export function faultResponse(reference: string): Response {
  const body = {
    type: "urn:bookmatch:problem:fault",
    title: "Something went wrong on our side",
    status: 500,
    detail: `Something went wrong on our side (ref ${reference}). Try again in a moment.`,
  };
  return Response.json(body, {
    status: 500,
    headers: { "content-type": "application/problem+json", "cache-control": "no-store" },
  });
}
