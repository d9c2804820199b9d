"use client";

import { lazy, Suspense, useEffect } from "react";
import type { Seen } from "@/components/bench/seen";
import { DoorScreen } from "@/components/door/door-screen";
import { EnrolScreen } from "@/components/door/enrol-screen";
import { PinScreen } from "@/components/door/pin-screen";
import { Purfling } from "@/components/ui/purfling";
import { spokenLanguage } from "@/lib/bench/language";

interface KioskScreenProps extends Seen {
  /** A code before the camera. */
  onText(text: string): void;
}

const load = () => import("@/components/door/behind-the-door");
const BehindTheDoor = lazy(async () => ({ default: (await load()).BehindTheDoor }));

/** The screen of the present state: screens are states, not addresses, so that no network is asked. */
export function KioskScreen({ onText, ...seen }: KioskScreenProps) {
  const { state, tap } = seen;
  const { screen } = state;
  // The door stands first; what is behind it is here before anybody has keyed a PIN.
  useEffect(() => void load(), []);
  switch (screen.at) {
    case "loading":
      return <NothingYet />;
    case "enrol":
      return <EnrolScreen tap={tap} screen={screen} />;
    case "door":
      return <DoorScreen {...seen} screen={screen} language={spokenLanguage(state)} />;
    case "pin":
      return <PinScreen {...seen} screen={screen} />;
    default:
      return (
        <Suspense fallback={<NothingYet />}>
          <BehindTheDoor {...seen} onText={onText} />
        </Suspense>
      );
  }
}

/** The two leaves, empty. */
function NothingYet() {
  return (
    <div className="kiosk leaves">
      <Purfling />
    </div>
  );
}
