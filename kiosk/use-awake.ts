"use client";

import { useEffect } from "react";

/** Keeps the tablet's screen on and, from the first finger on it, full; where the browser can. */
export function useAwake(): void {
  useEffect(() => {
    const stay = () => {
      if (document.visibilityState === "visible") {
        // Refused on a low battery: the screen then goes dark as the tablet likes.
        navigator.wakeLock?.request("screen").catch(() => undefined);
      }
    };
    const fill = (event: PointerEvent) => {
      if (event.pointerType !== "touch" || document.fullscreenElement) return;
      document.documentElement.requestFullscreen?.().catch(() => undefined);
    };
    stay();
    document.addEventListener("visibilitychange", stay);
    window.addEventListener("pointerup", fill, { once: true });
    return () => {
      document.removeEventListener("visibilitychange", stay);
      window.removeEventListener("pointerup", fill);
    };
  }, []);
}
