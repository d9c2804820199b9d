"use client";

import { useEffect, useEffectEvent } from "react";

/** Tells of every touch and key on the page: whoever stands here is still here. */
export function useTouch(onTouch: () => void): void {
  const touched = useEffectEvent(onTouch);
  useEffect(() => {
    const tell = () => touched();
    window.addEventListener("pointerdown", tell);
    window.addEventListener("keydown", tell);
    return () => {
      window.removeEventListener("pointerdown", tell);
      window.removeEventListener("keydown", tell);
    };
  }, []);
}
