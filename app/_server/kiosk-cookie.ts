import "server-only";
import { KIOSK_COOKIE, kioskTokenOf } from "@/app/_server/kiosk-actor";

/** As long as browsers keep any cookie (400 days); renewed at every hand-in. */
const MAX_AGE_SECONDS = 400 * 86_400;
const LOCAL = new Set(["localhost", "127.0.0.1", "[::1]"]);

/**
 * The `Set-Cookie` value that makes this browser the kiosk of `token`. `Secure` unless the browser
 * asked this machine itself, where there is no TLS.
 */
export function kioskCookie(token: string, request: Request): string {
  const parts = [
    `${KIOSK_COOKIE}=${token}`,
    "Path=/",
    `Max-Age=${MAX_AGE_SECONDS}`,
    "HttpOnly",
    "SameSite=Strict",
  ];
  return (isLocal(request) ? parts : [...parts, "Secure"]).join("; ");
}

/** The same for the kiosk that asks: its cookie lives on as long as it hands records in. */
export function renewedCookie(request: Request): string {
  return kioskCookie(kioskTokenOf(request) ?? "", request);
}

/** Next gives a handler the address that it listens on; the browser's own is in `Host`. */
function isLocal(request: Request): boolean {
  const host = request.headers.get("host") ?? new URL(request.url).host;
  return LOCAL.has(host.replace(/:\d+$/, ""));
}
