"use client";

import { useEffect, useEffectEvent } from "react";
import { makeWedgeReader } from "@/kiosk/wedge";

/**
 * Listens for a wedge scanner: a burst of keys that ends in Enter is one code, and that Enter
 * presses no button. Fields keep their own keys.
 */
export function useScanner(onText: (text: string) => void): void {
  const heard = useEffectEvent(onText);
  useEffect(() => {
    const reader = makeWedgeReader();
    const press = (event: KeyboardEvent) => {
      if (event.target instanceof HTMLInputElement) return;
      const text = reader.press({ key: event.key, atMs: event.timeStamp });
      if (text !== null || (reader.isBurst() && event.key.length === 1)) {
        event.preventDefault();
        event.stopImmediatePropagation();
      }
      if (text !== null) heard(text);
    };
    window.addEventListener("keydown", press, { capture: true });
    return () => window.removeEventListener("keydown", press, { capture: true });
  }, []);
}
