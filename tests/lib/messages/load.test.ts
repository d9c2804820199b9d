import { describe, expect, test } from "vitest";
import { language } from "@/lib/kiosks/schema";
import { otherWorkCodes } from "@/lib/ledger/other-work";
import { keptCodes, questionCodes } from "@/lib/ledger/schema";
import { en } from "@/lib/messages/en";
import { loadMessages } from "@/lib/messages/load";
import { read, sourceFiles } from "@/tests/setup/source";

/** Every message with its path, `door.next`. */
function flat(messages: object, path = ""): [string, string][] {
  return Object.entries(messages).flatMap(([key, value]) =>
    typeof value === "string"
      ? [[`${path}${key}`, value] satisfies [string, string]]
      : flat(value as object, `${path}${key}.`),
  );
}

/** The arguments of a message, `{time}` or `{count, plural, …}`, sorted. */
function argumentsOf(message: string): string[] {
  const names = [...message.matchAll(/\{(\w+)(?=[,}])/g)].map(([, name]) => name ?? "");
  return [...new Set(names)].sort();
}

const sources = sourceFiles(["components", "app", "lib", "kiosk"])
  .filter((file) => !file.startsWith("lib/messages/"))
  .map((file) => read(file));

/** Namespaces that some source reads, each with the name that its words go by there. */
const readers = sources.flatMap((text) =>
  [...text.matchAll(/const (\w+) = useTranslations\("(\w+)"\)/g)].map(([, name, space]) => ({
    text,
    name: name ?? "",
    space: space ?? "",
  })),
);

/** Whether a key is asked for by its name, or stands as a word of the code that is looked up. */
function isUsed(path: string): boolean {
  const [space = "", key = ""] = path.split(".");
  const own = readers.filter((reader) => reader.space === space);
  const asked = own.some(({ text, name }) => text.includes(`${name}("${key}"`));
  if (asked) return true;
  const isLookedUp = own.some(({ text, name }) => new RegExp(`\\b${name}\\([^")]`).test(text));
  const stem = key.replace(/How$/, "");
  return (
    isLookedUp && sources.some((text) => new RegExp(`["\`]${stem}["\`]|\\b${stem}:`).test(text))
  );
}

describe("loadMessages", () => {
  test("every language has every message of English, and no other", async () => {
    const loaded = await loadMessages();
    const keys = flat(en).map(([key]) => key);
    for (const each of language.options) {
      expect(
        flat(loaded[each]).map(([key]) => key),
        each,
      ).toEqual(keys);
    }
  });

  test("every translation takes the arguments of the original", async () => {
    const loaded = await loadMessages();
    for (const each of language.options) {
      const theirs = flat(loaded[each]).map(([key, text]) => [key, argumentsOf(text)]);
      expect(theirs, each).toEqual(flat(en).map(([key, text]) => [key, argumentsOf(text)]));
    }
  });

  test("every message is used", () => {
    expect(
      flat(en)
        .map(([key]) => key)
        .filter((key) => !isUsed(key)),
    ).toEqual([]);
  });

  test("no message is empty, shouts or scolds", async () => {
    const loaded = await loadMessages();
    const said = language.options.flatMap((each) => flat(loaded[each]));
    const wrong = /^\s*$|!|\b(invalid|failed|error)\b/i;
    expect(said.filter(([, text]) => wrong.test(text))).toEqual([]);
  });

  test("every other-work code and every question of the ledger has its words", () => {
    expect(Object.keys(en.other)).toEqual(expect.arrayContaining([...otherWorkCodes]));
    expect(Object.keys(en.ends).sort()).toEqual([...keptCodes, ...questionCodes].sort());
  });
});
