"use client";

import { useCallback, useEffect, useState } from "react";

/** The server's time as this browser can tell it, in epoch milliseconds. */
export interface ServerClock {
  /** As of the last tick; at first the moment at which the server drew the page. */
  nowMs: number;
  /** This very moment. */
  readMs: () => number;
}

/** Keeps the server's time: the browser's clock, corrected by what the server's was at the start. */
export function useServerClock(serverMs: number, tickMs: number): ServerClock {
  const [offsetMs] = useState(() => serverMs - Date.now());
  const [nowMs, setNowMs] = useState(serverMs);
  const readMs = useCallback(() => Date.now() + offsetMs, [offsetMs]);
  useEffect(() => {
    const timer = setInterval(() => setNowMs(readMs()), tickMs);
    return () => clearInterval(timer);
  }, [readMs, tickMs]);
  return { nowMs, readMs };
}
