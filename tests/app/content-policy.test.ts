import { createHash } from "node:crypto";
import { describe, expect, test } from "vitest";
import { contentPolicy, inlineDigests } from "@/app/_server/content-policy";

const digest = (text: string) => `'sha256-${createHash("sha256").update(text).digest("base64")}'`;

describe("inlineDigests", () => {
  test("names the scripts inside a page to the last character, each once", () => {
    const html = "<script>a()</script><script id='b'>\n b(\"<p>\") </script><script>a()</script>";
    expect(inlineDigests(html)).toEqual([digest("a()"), digest('\n b("<p>") ')]);
  });
  test("leaves scripts that the page loads to their address", () => {
    expect(inlineDigests('<script src="/theme.js"></script><script async src="/a.js">')).toEqual(
      [],
    );
  });
});

describe("contentPolicy", () => {
  const policy = contentPolicy(["'nonce-abc'"]);
  test("runs this server's scripts and the named ones, and evaluates nothing", () => {
    expect(policy).toContain("script-src 'self' 'nonce-abc';");
    expect(policy).not.toContain("unsafe-eval");
    expect(policy).not.toMatch(/script-src[^;]*unsafe-inline/);
  });
  test("lets nobody frame a page, send its forms elsewhere or move its base", () => {
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).toContain("form-action 'self'");
    expect(policy).toContain("base-uri 'none'");
  });
});
