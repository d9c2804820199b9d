"use client";

import { useEffect } from "react";
import { EnrolScreen } from "@/components/door/enrol-screen";
import { KioskWords } from "@/components/door/kiosk-words";
import { useKiosk } from "@/kiosk/use-kiosk";

/** The address of an enrolment code: asks for it also where this browser is a kiosk already. */
export function EnrolApp() {
  const { state, send } = useKiosk();
  const { screen } = state;
  useEffect(() => {
    if (screen.at === "door") send({ on: "show-enrol" });
  }, [screen.at, send]);
  return (
    <KioskWords state={state}>
      {screen.at === "enrol" && <EnrolScreen tap={send} screen={screen} />}
    </KioskWords>
  );
}
