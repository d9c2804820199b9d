"use client";

import { useCallback, useEffect, useState, useSyncExternalStore } from "react";
import { v7 } from "uuid";
import { type Machine, runKiosk } from "@/kiosk/machine";
import type { KioskState } from "@/lib/bench/schema";
import type { Input } from "@/lib/taps/inputs";
import { firstState } from "@/lib/taps/step";

/** Runs the kiosk for as long as the page is open, and draws the screen anew when it changes. */
export function useKiosk(): { state: KioskState; send: (input: Input) => void } {
  const [machine, setMachine] = useState<Machine | null>(null);
  useEffect(() => {
    let isGone = false;
    let running: Machine | undefined;
    void runKiosk({
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
