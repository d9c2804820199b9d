import { render } from "@testing-library/react";
import { IntlProvider } from "use-intl";
import { BehindTheDoor } from "@/components/door/behind-the-door";
import { KioskScreen } from "@/components/door/kiosk-screen";
import { en } from "@/lib/messages/en";
import type { Tap } from "@/lib/taps/inputs";
import type { TestKiosk } from "@/tests/make/bench";

/** Draws the screen on which a kiosk stands, in English; gives the taps that are made on it. */
export function draw(kiosk: TestKiosk): Tap[] {
  const taps: Tap[] = [];
  const isAtDoor = ["enrol", "door", "pin"].includes(kiosk.state.screen.at);
  const Screen = isAtDoor ? KioskScreen : BehindTheDoor;
  render(
    <IntlProvider locale="en" messages={en} timeZone="America/Chicago">
      <Screen state={kiosk.state} tap={(tap) => taps.push(tap)} onText={() => undefined} />
    </IntlProvider>,
  );
  return taps;
}
