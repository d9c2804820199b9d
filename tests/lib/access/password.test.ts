import { describe, expect, test } from "vitest";
import { PASSWORD_MIN, passwordFault, spelledPassword } from "@/lib/access/password";
import security from "@/tests/checks/security.json";

const expected = (id: string) => security.find((check) => check.id === id)!.expect;

describe("passwordFault", () => {
  test("the least length is NIST SP 800-63B-4's for a single factor", () => {
    expect(expected("pin-63b-4-final")).toMatchObject({ min_length_single_factor: PASSWORD_MIN });
  });

  test.each([
    ["four words of the bench", null],
    ["only-small-letters-in-it", null],
    ["Ω räfflor på gitarrhals", null],
    ["short but right", null],
    ["one letter few", "15 characters"],
    ["abcababcababcabab", "different"],
    ["Password and then some more", "first"],
    ["12345678901234567", "first"],
    ["098765432109876 and more", "first"],
    ["qwertyuiopasdfghj", "first"],
    ["margit.solberg knows it", "e-mail"],
  ])("%j: %s", (password, fault) => {
    const said = passwordFault(password, "Margit.Solberg@larkmoor.example");
    if (fault === null) expect(said).toBeNull();
    else expect(said).toContain(fault);
  });

  test("128 characters are taken, 129 are not", () => {
    const words = "a few words and ".repeat(8);
    expect(passwordFault(words, "a@b.example")).toBeNull();
    expect(passwordFault(`${words}x`, "a@b.example")).toContain("128");
  });

  test("each code point counts as one", () => {
    expect(passwordFault("🪵🎸🪚🧰🔨🪛📐🧵🪡🧶🎻🎼🎶🎵", "a@b.example")).toContain("15");
    expect(passwordFault("🪵🎸🪚🧰🔨🪛📐🧵🪡🧶🎻🎼🎶🎵🥁", "a@b.example")).toBeNull();
  });
});

describe("spelledPassword", () => {
  test("one password from two keyboards is one password", () => {
    expect(spelledPassword("re\u0301sine")).toBe(spelledPassword("r\u00e9sine"));
  });
});
