"use client";

import { KioskScreen } from "@/components/door/kiosk-screen";
import { KioskWords } from "@/components/door/kiosk-words";
import { useAwake } from "@/kiosk/use-awake";
import { useKiosk } from "@/kiosk/use-kiosk";
import { useScanner } from "@/kiosk/use-scanner";
import { useTouch } from "@/kiosk/use-touch";

/** The kiosk: one page whose screens are states of its reducer. */
export function KioskApp() {
  const { state, send } = useKiosk();
  useAwake();
  useScanner((text) => send({ on: "scan", text }));
  useTouch(() => send({ on: "touch" }));
  return (
    <KioskWords state={state}>
      <KioskScreen state={state} tap={send} onText={(text) => send({ on: "scan", text })} />
    </KioskWords>
  );
}
