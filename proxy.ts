import { randomBytes } from "node:crypto";
import { type NextRequest, NextResponse } from "next/server";
import { ASKED_FOR } from "@/app/_server/asked-for";
import { contentPolicy } from "@/app/_server/content-policy";
import { drawnAhead } from "@/app/_server/drawn-ahead";
import { problemResponse } from "@/app/_server/problem";

const isDevelopment = process.env.NODE_ENV === "development";
/** Two years, as long as browsers ask for before they take it seriously. */
const ONLY_HTTPS = "max-age=63072000";

/**
 * Gives every page its content policy: pages drawn ahead (the kiosk's) by the digests of their own
 * scripts, all others by a nonce made for this one answer.
 */
export function proxy(request: NextRequest): Response {
  if (!isReadable(request.nextUrl.pathname)) return problemResponse(UNREADABLE);
  // of what the API answers, nothing is a page
  if (request.nextUrl.pathname.startsWith("/api/")) return NextResponse.next();
  const drawn = isDevelopment ? undefined : drawnAhead().get(request.nextUrl.pathname);
  const policy = drawn ? contentPolicy(drawn) : noncePolicy();
  const headers = new Headers(request.headers);
  // a page does not know its own address; the sign-in needs it to lead on to it
  headers.set(ASKED_FOR, request.nextUrl.pathname + request.nextUrl.search);
  // Next reads the nonce from here and puts it on its own scripts
  if (!drawn) headers.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("content-security-policy", policy);
  if (request.headers.get("x-forwarded-proto") === "https")
    response.headers.set("strict-transport-security", ONLY_HTTPS);
  return response;
}

/** An address is read by its percent signs; Next itself has no answer to one that cannot be. */
function isReadable(pathname: string): boolean {
  try {
    decodeURIComponent(pathname);
    return true;
  } catch {
    return false; // URIError is all that it throws
  }
}

const UNREADABLE = {
  code: "notFound",
  detail: "There is nothing at this address: a percent sign in it is not followed by a character.",
} as const;

/** Any path may turn out not to exist, and the page that says so is drawn ahead. */
function noncePolicy(): string {
  const nonce = `'nonce-${randomBytes(16).toString("base64")}'`;
  if (isDevelopment) return contentPolicy([nonce], true);
  return contentPolicy([nonce, ...(drawnAhead().get("/_not-found") ?? [])]);
}

/**
 * Pages only: what the API answers runs no script, and files carry none. Of the API's addresses those
 * with a percent sign, which may be one that cannot be read.
 */
export const config = {
  matcher: ["/((?!api/|_next/|theme\\.js|sw\\.js|icon\\.svg).*)", "/api/:path(.*%.*)"],
};
