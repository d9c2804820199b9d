import { randomBytes } from "node:crypto";
import { type NextRequest, NextResponse } from "next/server";
import { contentPolicy } from "@/app/_server/content-policy";
import { drawnAhead } from "@/app/_server/drawn-ahead";

const isDevelopment = process.env.NODE_ENV === "development";
/** Two years, as long as browsers ask for before they take it seriously. */
const ONLY_HTTPS = "max-age=63072000";

/**
 * Gives every page its content policy: pages drawn ahead (the kiosk's) by the digests of their own
 * scripts, all others by a nonce made for this one answer.
 */
export function proxy(request: NextRequest): NextResponse {
  const drawn = isDevelopment ? undefined : drawnAhead().get(request.nextUrl.pathname);
  const policy = drawn ? contentPolicy(drawn) : noncePolicy();
  const headers = new Headers(request.headers);
  // Next reads the nonce from here and puts it on its own scripts
  if (!drawn) headers.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("content-security-policy", policy);
  if (request.headers.get("x-forwarded-proto") === "https")
    response.headers.set("strict-transport-security", ONLY_HTTPS);
  return response;
}

/** Any path may turn out not to exist, and the page that says so is drawn ahead. */
function noncePolicy(): string {
  const nonce = `'nonce-${randomBytes(16).toString("base64")}'`;
  if (isDevelopment) return contentPolicy([nonce], true);
  return contentPolicy([nonce, ...(drawnAhead().get("/_not-found") ?? [])]);
}

/** Pages only: what the API answers runs no script, and files carry none. */
export const config = { matcher: "/((?!api/|_next/|theme\\.js|sw\\.js|icon\\.svg).*)" };
