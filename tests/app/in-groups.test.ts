import { describe, expect, test } from "vitest";
import { inGroups } from "@/app/_server/in-groups";

/** A question that is answered when the test says so. */
function asked() {
  const groups: { keys: readonly string[]; answer: () => void; fail: () => void }[] = [];
  const ask = inGroups<string>(
    (keys) =>
      new Promise((resolve, reject) => {
        groups.push({
          keys,
          answer: () =>
            resolve(new Map(keys.flatMap((key) => (key === "?" ? [] : [[key, `<${key}>`]])))),
          fail: () => reject(new Error("the database is away")),
        });
      }),
  );
  return { groups, ask };
}

const turn = () => new Promise((resolve) => setTimeout(resolve, 0));

describe("inGroups", () => {
  test("who is alone is asked for at once; who comes meanwhile, together and each once", async () => {
    const { groups, ask } = asked();
    const first = ask("a");
    await turn();
    const others = [ask("b"), ask("c"), ask("b"), ask("?")];
    await turn();
    expect(groups.map(({ keys }) => keys)).toEqual([["a"]]);
    groups[0]?.answer();
    expect(await first).toBe("<a>");
    await turn();
    expect(groups.map(({ keys }) => keys)).toEqual([["a"], ["b", "c", "?"]]);
    groups[1]?.answer();
    expect(await Promise.all(others)).toEqual(["<b>", "<c>", "<b>", undefined]);
  });

  test("an answer is never older than its question: the same key is asked for again", async () => {
    const { groups, ask } = asked();
    const first = ask("a");
    await turn();
    const again = ask("a");
    groups[0]?.answer();
    await first;
    await turn();
    groups[1]?.answer();
    expect(await again).toBe("<a>");
    expect(groups).toHaveLength(2);
  });

  test("a question that fails fails for those who asked it, and the next one is asked", async () => {
    const { groups, ask } = asked();
    const first = ask("a").catch((error: Error) => error.message);
    await turn();
    const next = ask("b");
    groups[0]?.fail();
    expect(await first).toBe("the database is away");
    await turn();
    groups[1]?.answer();
    expect(await next).toBe("<b>");
  });
});
