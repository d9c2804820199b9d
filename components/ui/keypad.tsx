"use client";

import { useEffect, useEffectEvent } from "react";
import { Icon } from "@/components/ui/icon";

export interface KeypadProps {
  onDigit: (digit: string) => void;
  onRubOut: () => void;
  onOk: () => void;
  okLabel: string;
  rubOutLabel: string;
  okDisabled?: boolean;
  /** round on the day's rim, or on both where the pad lies across the seam */
  rim?: "right" | "both";
  className?: string;
}

/**
 * The number pad: one board divided by kerfs. A keyboard types on it too: digits, Backspace and
 * Enter, unless something else has taken the key or a field has the focus.
 */
export function Keypad({
  onDigit,
  onRubOut,
  onOk,
  okLabel,
  rubOutLabel,
  okDisabled = false,
  rim = "right",
  className = "",
}: KeypadProps) {
  const typed = useEffectEvent((event: KeyboardEvent) => {
    if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
    const on = event.target instanceof Element ? event.target.tagName : "";
    if (on === "INPUT" || on === "TEXTAREA" || on === "SELECT") return;
    if (/^\d$/.test(event.key)) onDigit(event.key);
    if (event.key === "Backspace") onRubOut();
    if (event.key === "Enter" && on !== "BUTTON" && !okDisabled) onOk();
  });
  useEffect(() => {
    window.addEventListener("keydown", typed);
    return () => window.removeEventListener("keydown", typed);
  }, []);

  return (
    <div className={`pad ${className}`} data-rim={rim}>
      {["1", "2", "3", "4", "5", "6", "7", "8", "9"].map((digit) => (
        <button key={digit} type="button" onClick={() => onDigit(digit)}>
          {digit}
        </button>
      ))}
      <button type="button" aria-label={rubOutLabel} onClick={onRubOut}>
        <Icon name="rub-out" />
      </button>
      <button type="button" onClick={() => onDigit("0")}>
        0
      </button>
      <button type="button" data-key="ok" disabled={okDisabled} onClick={onOk}>
        {okLabel}
      </button>
    </div>
  );
}
