import { describe, expect, test } from "vitest";
import { languageOf } from "@/lib/kiosks/languages";

describe("languageOf", () => {
  test.each([
    ["es", "es"],
    ["es-MX", "es"],
    ["en-GB", "en"],
    ["vi", null],
    ["", null],
    [undefined, null],
    [null, null],
  ])("%s is spoken as %s", (locale, spoken) => expect(languageOf(locale)).toBe(spoken));
});
