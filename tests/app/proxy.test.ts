import { NextRequest } from "next/server";
import { describe, expect, test } from "vitest";
import { config, proxy } from "@/proxy";

const ask = (path: string) => proxy(new NextRequest(`http://localhost${path}`));

describe("proxy", () => {
  test.each([
    "/api/v1/tickets/%ZZ",
    "/api/kiosk/tickets/%",
    "/api/v1/tickets/%C0%80",
    "/tickets/%ZZ",
  ])("%s, which nobody can read, is answered in our words", async (path) => {
    const answer = ask(path);
    expect(answer.status).toBe(404);
    expect(answer.headers.get("content-type")).toBe("application/problem+json");
    expect(await answer.json()).toMatchObject({ status: 404, title: "Not found here" });
  });

  test("lets what the API can read through, and gives it no page's policy", () => {
    const answer = ask("/api/v1/tickets/26%2D04817%2D6?q=%ZZ");
    expect(answer.headers.get("x-middleware-next")).toBe("1");
    expect(answer.headers.get("content-security-policy")).toBeNull();
  });

  test("stands in no hand-in's way: of the API's addresses it sees those with a percent sign", () => {
    expect(config.matcher).toContain("/api/:path(.*%.*)");
  });
});
