import { describe, expect, test } from "vitest";
import { badgeCode } from "@/lib/codes/badge-code";
import { benchOf, NIA, sessionOf, TestKiosk } from "@/tests/make/bench";

const badge = badgeCode(NIA);

describe("the door", () => {
  test("a keyed number asks for the PIN, whether or not a session is open", () => {
    const kiosk = TestKiosk.atBench().send({ on: "leave" }).key(NIA).send({ on: "submit" });
    expect(kiosk.state.screen).toMatchObject({ at: "pin", worker: NIA, reason: { for: "enter" } });
  });

  test("a badge asks for the PIN at the first act on this kiosk", () => {
    const kiosk = TestKiosk.atDoor().send({ on: "scan", text: badge });
    expect(kiosk.state.screen).toMatchObject({ at: "pin", worker: NIA });
  });

  test("a badge alone opens the session again in between", () => {
    const kiosk = TestKiosk.atBench().send({ on: "leave" }, { on: "scan", text: badge });
    expect(kiosk.state.screen.at).toBe("bench");
    expect(kiosk.effects.at(-1)).toEqual({ do: "fetch-bench", worker: NIA });
  });

  test("a badge that cannot be read and a ticket are told apart", () => {
    const kiosk = TestKiosk.atDoor();
    kiosk.send({ on: "scan", text: "W104299" });
    expect(kiosk.state.screen).toMatchObject({ at: "door", says: "unread-badge" });
    kiosk.send({ on: "scan", text: "T26048176" });
    expect(kiosk.state.screen).toMatchObject({ at: "door", says: "ticket-first" });
  });

  test("another worker's badge takes over from whoever walked away", () => {
    const kiosk = TestKiosk.atBench().send({ on: "scan", text: badgeCode("1043") });
    expect(kiosk.state.visit).toBeNull();
    expect(kiosk.state.screen).toMatchObject({ at: "pin", worker: "1043" });
  });

  test("a number has eight digits at most and can be rubbed out", () => {
    const kiosk = TestKiosk.atDoor().key("123456789").send({ on: "rub-out" });
    expect(kiosk.state.screen).toMatchObject({ at: "door", digits: "1234567" });
  });
});

describe("the PIN", () => {
  test("the sixth digit hands it in, once", () => {
    const kiosk = TestKiosk.atDoor().key(NIA).send({ on: "submit" }).key("2718281");
    const asked = kiosk.effects.filter(({ do: what }) => what === "sign-in");
    expect(asked).toEqual([{ do: "sign-in", worker: NIA, pin: "271828" }]);
  });

  test("a wrong one is keyed anew, and a throttled one waits until its time", () => {
    const kiosk = TestKiosk.atDoor().key(NIA).send({ on: "submit" }).key("111111");
    kiosk.send({ on: "sign-in-refused", worker: NIA, says: "wrong", waitSeconds: 30 });
    expect(kiosk.state.screen).toMatchObject({ at: "pin", digits: "", says: "wrong" });
    expect(kiosk.key("2").state.screen).toMatchObject({ digits: "" });
    kiosk.pass(15).send({ on: "touch" }).pass(15);
    expect(kiosk.state.screen).toMatchObject({ at: "pin", waitUntilMs: null, says: null });
    expect(kiosk.key("2").state.screen).toMatchObject({ digits: "2" });
  });

  test("an answer that comes after the screen went opens nobody's bench", () => {
    const kiosk = TestKiosk.atDoor().key(NIA).send({ on: "submit" }).key("271828");
    kiosk.send({ on: "back" }).send({ on: "signed-in", session: sessionOf(), bench: benchOf() });
    expect(kiosk.state.screen.at).toBe("door");
    expect(kiosk.state.visit).toBeNull();
  });
});

describe("the start of a shift", () => {
  test("one tap starts it, and in the start window the door comes back 1.5 s later", () => {
    const kiosk = TestKiosk.atDoor().signIn().send({ on: "start-shift" });
    expect(kiosk.kinds).toEqual(["shift-start"]);
    expect(kiosk.pass(1.4).state.screen.at).toBe("done");
    expect(kiosk.pass(0.1).state.screen.at).toBe("door");
  });

  test("outside the start window the card stays 4 s", () => {
    const kiosk = TestKiosk.atDoor();
    kiosk.nowMs += 2 * 3_600_000;
    kiosk.signIn().send({ on: "start-shift" });
    expect(kiosk.pass(3.9).state.screen.at).toBe("done");
    expect(kiosk.pass(0.1).state.screen.at).toBe("door");
  });

  test("a kiosk that knows nothing takes the word of who is already in, and starts no shift", () => {
    const kiosk = TestKiosk.atDoor().key(NIA).send({ on: "submit" }).key("271828");
    kiosk.send({ on: "signed-in", session: sessionOf({ token: null }), bench: null });
    expect(kiosk.state.screen.at).toBe("start-shift");
    expect(kiosk.view.isKnown).toBe(false);
    kiosk.send({ on: "say-in" });
    expect(kiosk.state.screen.at).toBe("bench");
    expect(kiosk.kinds).toEqual([]);
  });
});
