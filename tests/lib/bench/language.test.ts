import { describe, expect, test } from "vitest";
import { spokenLanguage } from "@/lib/bench/language";
import { benchOf, cell, sessionOf, TestKiosk } from "@/tests/make/bench";

const spanish = sessionOf({ language: "es" });

describe("spokenLanguage", () => {
  test("the door speaks the site's language until one is chosen", () => {
    const kiosk = TestKiosk.atDoor();
    expect(spokenLanguage(kiosk.state)).toBe("en");
    expect(spokenLanguage(kiosk.send({ on: "language", language: "es" }).state)).toBe("es");
  });

  test("behind the door it is the worker's own", () => {
    const kiosk = TestKiosk.atDoor().key("1042").send({ on: "submit" }).key("271828");
    kiosk.send({ on: "signed-in", session: spanish, bench: benchOf() });
    expect(spokenLanguage(kiosk.state)).toBe("es");
    expect(spokenLanguage(kiosk.send({ on: "leave" }).state)).toBe("en");
  });

  test("the PIN is asked for in the worker's language where this tablet knows it", () => {
    const people = cell.people.map((person) => ({ ...person, language: "es" }));
    const kiosk = TestKiosk.atDoor().send({ on: "cell", cell: { ...cell, people } });
    kiosk.key("1042").send({ on: "submit" });
    expect(spokenLanguage(kiosk.state)).toBe("es");
  });

  test("what was chosen at the door goes before the worker's own, for this visit", () => {
    const kiosk = TestKiosk.atDoor().send({ on: "language", language: "en" });
    kiosk.key("1042").send({ on: "submit" }).key("271828");
    kiosk.send({ on: "signed-in", session: spanish, bench: benchOf() });
    expect(spokenLanguage(kiosk.state)).toBe("en");
  });

  test("a language that the kiosk does not speak falls back to the site's, then to English", () => {
    const kiosk = TestKiosk.atDoor().key("1042").send({ on: "submit" }).key("271828");
    kiosk.send({ on: "signed-in", session: sessionOf({ language: "fi" }), bench: benchOf() });
    expect(spokenLanguage(kiosk.state)).toBe("en");
  });
});
