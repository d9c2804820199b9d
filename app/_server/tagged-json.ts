import "server-only";
import { createHash } from "node:crypto";

/**
 * Answers JSON with a strong `ETag` of its bytes, or 304 where the caller has just these (RFC 9110
 * 13.1.2). The caller may keep it but must ask again before each use.
 */
export function taggedJson(request: Request, value: unknown): Response {
  const body = JSON.stringify(value);
  const etag = `"${createHash("sha256").update(body).digest("base64url").slice(0, 27)}"`;
  const headers = {
    etag,
    "cache-control": "private, no-cache",
    "content-type": "application/json",
  };
  const known = (request.headers.get("if-none-match") ?? "").split(",").map((tag) => tag.trim());
  const isSame = known.some((tag) => tag.replace(/^W\//, "") === etag);
  return isSame ? new Response(null, { status: 304, headers }) : new Response(body, { headers });
}
