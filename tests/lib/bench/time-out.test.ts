import { describe, expect, test } from "vitest";
import { stayOf } from "@/lib/bench/time-out";
import { TestKiosk } from "@/tests/make/bench";

const seconds = (kiosk: TestKiosk) => {
  const stay = stayOf(kiosk.state);
  return stay && (stay.untilMs - stay.fromMs) / 1000;
};

describe("stayOf", () => {
  test("follows the screens: bench 20 s, a finished act 4 s, a card 120 s", () => {
    const kiosk = TestKiosk.atWork();
    expect(seconds(kiosk)).toBe(20);
    expect(seconds(kiosk.send({ on: "end-shift" }))).toBe(120);
    expect(seconds(kiosk.send({ on: "back" }, { on: "show-break" }))).toBe(20);
    expect(seconds(kiosk.send({ on: "break", break: "rest" }))).toBe(4);
  });

  test("an idle door stays, one with a number half keyed does not", () => {
    expect(seconds(TestKiosk.atDoor())).toBeNull();
    expect(seconds(TestKiosk.atDoor().key("1"))).toBe(20);
  });

  test("nothing goes while the disk or the server is waited for", () => {
    const checking = TestKiosk.atDoor().key("1042").send({ on: "submit" }).key("271828");
    expect(seconds(checking)).toBeNull();
    const saving = TestKiosk.atWork();
    saving.slowDisk = true;
    expect(seconds(saving.send({ on: "show-break" }, { on: "break", break: "rest" }))).toBeNull();
  });
});
