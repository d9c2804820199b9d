import "server-only";

/** Reads the token of an `Authorization: Bearer` header; null if there is none (RFC 6750). */
export function bearerOf(request: Request): string | null {
  const match = /^Bearer ([\w.~+/=-]{1,512})$/i.exec(request.headers.get("authorization") ?? "");
  return match?.[1] ?? null;
}
