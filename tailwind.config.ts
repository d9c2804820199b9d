import type { Config } from "tailwindcss";

/** A token of app/globals.css as a Tailwind value: the numbers live there, once. */
const token = (name: string) => `var(--${name})`;

/** Colours by meaning; nothing of Tailwind's own palette is left to reach for. */
const colors = {
  transparent: "transparent",
  current: "currentColor",
  inherit: "inherit",
  book: token("surface-book"),
  day: token("surface-day"),
  raised: token("surface-raised"),
  sunk: token("surface-sunk"),
  ink: { DEFAULT: token("ink"), 2: token("ink-2"), 3: token("ink-3") },
  "on-ink": token("on-ink"),
  line: { DEFAULT: token("line"), strong: token("line-strong") },
  seam: { dark: token("seam-dark"), light: token("seam-light") },
  standard: {
    fill: token("standard-fill"),
    edge: token("standard-edge"),
    ink: token("standard-ink"),
  },
  actual: token("actual"),
  "on-actual": token("on-actual"),
  under: token("under"),
  over: token("over"),
  "on-over": token("on-over"),
  indirect: token("indirect"),
  hold: { DEFAULT: token("hold"), tint: token("hold-tint") },
  "on-hold": token("on-hold"),
  danger: token("danger"),
  "on-danger": token("on-danger"),
  focus: token("focus"),
  caution: { DEFAULT: token("caution"), ink: token("caution-ink") },
  mandatory: token("mandatory"),
  scrim: token("scrim"),
};

/** Desk `text-t-…` from 15 px by 1.2, kiosk `text-k-…` from 20 px, wall `text-w-…` from 24 px. */
const fontSize = {
  "t-1": "12px",
  "t-2": "13px",
  "t-3": "15px",
  "t-4": "18px",
  "t-5": "22px",
  "t-6": "28px",
  "t-7": "40px",
  "k-1": "20px",
  "k-2": "24px",
  "k-3": "29px",
  "k-4": "36px",
  "k-5": "52px",
  "k-6": "84px",
  "k-7": "148px",
  "w-1": "24px",
  "w-2": "30px",
  "w-3": "40px",
  "w-4": "64px",
  "w-5": "104px",
};

export default {
  content: [],
  theme: {
    colors,
    fontSize,
    fontFamily: { sans: token("font"), mono: token("mono") },
    borderRadius: { none: "0", 1: token("rim-1"), 2: token("rim-2"), 3: token("rim-3") },
    boxShadow: { none: "none" },
    extend: {
      spacing: {
        touch: token("touch"),
        "touch-min": token("touch-min"),
        "desk-target": token("desk-target"),
      },
      transitionDuration: {
        tap: token("tap"),
        open: token("open"),
        close: token("close"),
        draw: token("draw"),
      },
      transitionTimingFunction: { DEFAULT: token("ease") },
    },
  },
} satisfies Config;
