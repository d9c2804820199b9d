"use client";

import { useSyncExternalStore } from "react";

const STORE = "bookmatch-theme"; // as in public/theme.js, which reads it before the first paint
const themes = [
  { value: "light", name: "Light" },
  { value: "dark", name: "Dark" },
  { value: "", name: "As the device" },
] as const;

const listeners = new Set<() => void>();

function subscribe(listener: () => void) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

const chosen = () => document.documentElement.dataset.theme ?? "";

function choose(theme: string) {
  const { dataset } = document.documentElement;
  if (theme) dataset.theme = theme;
  else delete dataset.theme;
  if (theme) localStorage.setItem(STORE, theme);
  else localStorage.removeItem(STORE);
  for (const listener of listeners) listener();
}

/** Light for the hall, dark for spray and dim rooms, or as the device has it. */
export function ThemeSwitch() {
  const theme = useSyncExternalStore(subscribe, chosen, () => "");
  return (
    <fieldset className="flex flex-wrap gap-x-4">
      <legend className="text-t-2 text-ink-2">Colours</legend>
      {themes.map(({ value, name }) => (
        <label key={name} className="tick-field">
          <input
            type="radio"
            name="theme"
            checked={theme === value}
            onChange={() => choose(value)}
          />
          {name}
        </label>
      ))}
    </fieldset>
  );
}
