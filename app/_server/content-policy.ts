import "server-only";
import { createHash } from "node:crypto";

/** A script inside a page, not one that it loads. */
const INLINE = /<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/g;

/** Lists the digests of the scripts inside a page, as a content policy names them; each once. */
export function inlineDigests(html: string): string[] {
  const digests = [...html.matchAll(INLINE)].map(
    ([, text]) => `'sha256-${createHash("sha256").update(text!).digest("base64")}'`,
  );
  return [...new Set(digests)];
}

/**
 * Says what a page may load and run: only what this server gives, and of scripts inside the page
 * only those that `scripts` names, by digest or nonce. Style attributes stay free: the seam gauge is
 * drawn from numbers in them.
 *
 * @param scripts `'sha256-…'` and `'nonce-…'` sources
 * @param isDevelopment lets the development server evaluate code and talk to the page
 */
export function contentPolicy(scripts: readonly string[], isDevelopment = false): string {
  const directives = {
    "default-src": ["'self'"],
    "script-src": ["'self'", ...scripts, ...(isDevelopment ? ["'unsafe-eval'"] : [])],
    "style-src": ["'self'", ...(isDevelopment ? ["'unsafe-inline'"] : [])],
    "style-src-attr": ["'unsafe-inline'"],
    "img-src": ["'self'", "data:", "blob:"],
    "media-src": ["'self'", "blob:"],
    "font-src": ["'self'"],
    "connect-src": ["'self'", ...(isDevelopment ? ["ws:"] : [])],
    "worker-src": ["'self'"],
    "object-src": ["'none'"],
    "base-uri": ["'none'"],
    "form-action": ["'self'"],
    "frame-ancestors": ["'none'"],
  };
  return Object.entries(directives)
    .map(([name, sources]) => `${name} ${sources.join(" ")}`)
    .join("; ");
}
