"use client";

import { useCallback, useEffect, useState, useSyncExternalStore } from "react";
import { v7 } from "uuid";
import type { Machine, MachineParts } from "@/kiosk/machine";
import { firstState } from "@/lib/bench/first-state";
import type { KioskState } from "@/lib/bench/schema";
import type { Input } from "@/lib/taps/inputs";

/** Runs the kiosk for as long as the page is open, and draws the screen anew when it changes. */
export function useKiosk(): { state: KioskState; send: (input: Input) => void } {
  const [machine, setMachine] = useState<Machine | null>(null);
  useEffect(() => {
    let isGone = false;
    let running: Machine | undefined;
    void startKiosk({
      fetcher: (...asked) => fetch(...asked),
      clocks: { wallMs: () => Date.now(), monotonicMs: () => performance.now() },
      newId: () => v7(),
      random: () => Math.random(),
      reload: () => window.location.reload(),
    }).then((started) => {
      running = started;
      if (isGone) started.stop();
      else setMachine(started);
    });
    return () => {
      isGone = true;
      running?.stop();
    };
  }, []);
  const subscribe = useCallback(
    (listener: () => void) => machine?.subscribe(listener) ?? (() => undefined),
    [machine],
  );
  const state = useSyncExternalStore(
    subscribe,
    () => machine?.state() ?? firstState,
    () => firstState,
  );
  const send = useCallback((input: Input) => machine?.send(input), [machine]);
  useEffect(() => {
    if (!machine) return;
    const wake = () => {
      if (document.visibilityState === "visible") machine.wake();
    };
    window.addEventListener("online", wake);
    document.addEventListener("visibilitychange", wake);
    return () => {
      window.removeEventListener("online", wake);
      document.removeEventListener("visibilitychange", wake);
    };
  }, [machine]);
  return { state, send };
}

/** The machine and all that it reads by are a script of their own: the first paint needs neither. */
async function startKiosk(parts: MachineParts): Promise<Machine> {
  const { runKiosk } = await import("@/kiosk/machine");
  return runKiosk(parts);
}
