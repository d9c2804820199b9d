import { describe, expect, test } from "vitest";
import { taggedJson } from "@/app/_server/tagged-json";

const asked = (tag?: string) =>
  new Request("http://127.0.0.1/", tag ? { headers: { "if-none-match": tag } } : {});

describe("taggedJson", () => {
  const first = taggedJson(asked(), { a: 1 });
  const tag = first.headers.get("etag")!;

  test("answers the value with a tag of it", async () => {
    expect(first.status).toBe(200);
    expect(await first.json()).toEqual({ a: 1 });
    expect(taggedJson(asked(), { a: 2 }).headers.get("etag")).not.toBe(tag);
  });

  test.each([tag, `W/${tag}`, `"other", ${tag}`])(
    "who has %s gets no body again",
    async (known) => {
      const answer = taggedJson(asked(known), { a: 1 });
      expect(answer.status).toBe(304);
      expect(await answer.text()).toBe("");
    },
  );

  test("a changed value is sent whole", () => {
    expect(taggedJson(asked(tag), { a: 2 }).status).toBe(200);
  });
});
