import { describe, expect, test, vi } from "vitest";
import { z } from "zod";
import { fetchJson } from "@/components/fetch-json";

const shape = z.object({ a: z.number() });
const answering = (answer: () => Promise<Response>) => vi.stubGlobal("fetch", vi.fn(answer));

describe("fetchJson", () => {
  test("gives what the schema reads", async () => {
    answering(async () => Response.json({ a: 1, b: 2 }));
    expect(await fetchJson("/api/a", shape)).toEqual({ a: 1 });
  });

  test("a problem's own sentence reaches the screen, with its status", async () => {
    answering(async () => Response.json({ detail: "Wait a moment." }, { status: 503 }));
    await expect(fetchJson("/api/a", shape)).rejects.toMatchObject({
      message: "Wait a moment.",
      status: 503,
    });
  });

  test("an answer that is no problem, and no answer at all, still say something", async () => {
    answering(async () => new Response("<html>", { status: 502 }));
    await expect(fetchJson("/api/a", shape)).rejects.toThrow("could not answer");
    answering(() => Promise.reject(new TypeError("failed")));
    await expect(fetchJson("/api/a", shape)).rejects.toMatchObject({ status: 0 });
  });
});
