/** One stroke or shape of an icon: a path, and what differs from the plain 2.5 px line. */
export interface Stroke {
  d: string;
  solid?: true;
  width?: number;
  dash?: string;
}

const line = (...paths: string[]): readonly Stroke[] => paths.map((d) => ({ d }));

/** Our own line icons on a 32 grid, 2.5 px stroke, butt caps and round joins. */
export const iconPaths = {
  // acts at the bench
  scan: line("M3 10V4h6M23 4h6v6M29 22v6h-6M9 28H3v-6", "M9 10v12M13 10v12M16.5 10v12M22 10v12"),
  keys: line(
    "M5 5h6v6H5zM13 5h6v6h-6zM21 5h6v6h-6zM5 13h6v6H5zM13 13h6v6h-6zM21 13h6v6h-6zM13 21h6v6h-6z",
  ),
  change: line("M4 11h22M20 5l6 6-6 6", "M28 22H6M12 28l-6-6 6-6"),
  add: line("M16 5v22M5 16h22"),
  less: line("M5 16h22"),
  rest: line(
    "M5 13h17v9a5 5 0 0 1-5 5h-7a5 5 0 0 1-5-5z",
    "M22 15h3a3 3 0 0 1 3 3v1a3 3 0 0 1-3 3h-3M10 9c-2-2 2-3 0-6M16 9c-2-2 2-3 0-6",
  ),
  meal: line(
    "M4 16h24a12 11 0 0 1-24 0z",
    "M11 27h10M9 11c-2-2 2-3 0-6M16 11c-2-2 2-3 0-6M23 11c-2-2 2-3 0-6",
  ),
  "other-work": line(
    "M3 12c0-4 3-5 6-5h20v6H12c-2 0-3 2-3 4",
    "M9 13v14M13.5 13v12M18 13v14M22.5 13v12M27 13v14",
  ),
  setup: line("M4 28L17 15", "M27 8a7 7 0 0 1-9.5 8A7 7 0 0 1 24 5l-3.5 4 2.5 2.5z"),
  run: line("M9 5l17 11L9 27z"),
  pause: [{ d: "M11 5v22M21 5v22", width: 5 }],
  undo: line("M11 5L4 12l7 7", "M4 12h15a8 8 0 0 1 0 16h-7"),
  in: line("M19 4h9v24h-9", "M4 16h17M14 9l7 7-7 7"),
  out: line("M13 4H4v24h9", "M10 16h18M21 9l7 7-7 7"),
  badge: line(
    "M6 9h20v19H6zM13 9V4h6v5",
    "M16 20a3 3 0 1 0 0-6 3 3 0 0 0 0 6zM10.5 28c0-4 2.5-6 5.5-6s5.5 2 5.5 6",
  ),
  light: line("M10 4h12v5l-3 4v15h-6V13l-3-4z", "M10 9h12M16 17v3"),
  lead: line("M6 23h20l-3-4v-6a7 7 0 0 0-14 0v6zM13 27h6"),
  "rub-out": line("M11 6h18v20H11L3 16z", "M16 12l8 8M24 12l-8 8"),
  sound: line("M4 12h5l8-7v22l-8-7H4z", "M22 11a7 7 0 0 1 0 10M25.5 7a12 12 0 0 1 0 18"),
  "sound-off": line("M4 12h5l8-7v22l-8-7H4z", "M22 12l8 8M30 12l-8 8"),

  // what came of it
  good: line("M4 17l8 9L28 6"),
  rework: line("M6 8v7h7", "M7 14a10 10 0 1 1-1 6"),
  scrap: line("M13 5H4v22h9M19 27h9V5h-9", "M13 5l3 6-4 5 5 5-4 6M19 5l3 6-4 5 5 5-4 6"),

  // states: two leaves at a seam, the shape tells which
  "on-standard": [
    { d: "M16 3v26" },
    { d: "M15 9H5v14h10z" },
    { d: "M17 9h10v14H17z", solid: true },
  ],
  over: [
    { d: "M12 3v26" },
    { d: "M11 9H4v14h7z" },
    { d: "M13 9h7v14h-7z", solid: true },
    { d: "M23 9l-2 14M26 9l-2 14M29 9l-2 14" },
  ],
  under: [
    { d: "M16 3v26" },
    { d: "M15 9H4v14h11z" },
    { d: "M17 9h5v14h-5z", solid: true },
    { d: "M25 9h3v3M28 15v2M28 20v3h-3", width: 2 },
  ],
  "no-standard": [
    { d: "M16 3v26" },
    { d: "M12 9h-2M7 9H5v3M5 15v2M5 20v3h2M10 23h2", width: 2 },
    { d: "M17 9h10v14H17z" },
  ],
  loose: [
    { d: "M16 3v26", dash: "4 4" },
    { d: "M13 8L5 11l3 14 7-2z" },
    { d: "M20 8h8v14h-8z", dash: "4 3" },
  ],
  clamp: line("M26 8V4H6v24h12v-4H10V8z", "M22 8v15M17 12h10M17 16h10M18 27h9"),
  connected: line("M2 16h6M8 10h9v12H8z", "M17 13h6v6h-6M23 14.5h4l2 1.5-2 1.5h-4"),
  "saved-here": line(
    "M1 20h4M5 14h7v12H5z",
    "M12 17h5v6h-5",
    "M22 20h9M22 15v10",
    "M15 11l-3-4M19 10V5M23 11l3-4",
  ),

  // the office
  ticket: line("M6 4h20v24H6z", "M11 10v7M15 10v7M18 10v7M21.5 10v7M11 22h10"),
  people: line(
    "M11 15a5 5 0 1 0 0-10 5 5 0 0 0 0 10zM2 27c0-6 4-9 9-9s9 3 9 9",
    "M21 6a5 5 0 0 1 0 9M24 18c4 1 6 4 6 9",
  ),
  tablet: line("M4 6h24v20H4z", "M13 22h6"),
  clock: line("M16 28a12 12 0 1 0 0-24 12 12 0 0 0 0 24z", "M16 9v7l5 4"),
  calendar: line("M4 7h24v21H4zM4 13h24M10 3v7M22 3v7"),
  leaves: line("M4 9h24v5H4zM4 14h24v5H4zM4 19h24v5H4z"),
  file: line("M7 3h12l7 7v19H7zM19 3v7h7M12 17h9M12 22h9"),
  save: line("M16 4v16M9 13l7 7 7-7", "M4 22v6h24v-6"),
  print: line("M9 11V4h14v7M9 23H4V11h24v12h-5", "M9 19h14v9H9z"),
  edit: line("M5 27l2-8L22 4l6 6-15 15zM18 8l6 6"),
  find: line("M13 22a9 9 0 1 0 0-18 9 9 0 0 0 0 18zM20 20l9 9"),
  lock: line("M6 14h20v14H6zM10 14v-4a6 6 0 0 1 12 0v4M16 19v4"),
  message: line("M4 5h24v17H14l-6 6v-6H4z", "M10 11h12M10 16h8"),
  sun: line(
    "M16 21a5 5 0 1 0 0-10 5 5 0 0 0 0 10z",
    "M16 3v4M16 25v4M3 16h4M25 16h4M7 7l3 3M22 22l3 3M25 7l-3 3M10 22l-3 3",
  ),
  moon: line("M20 4a12 12 0 1 0 8 17A11 11 0 0 1 20 4z"),

  // ways
  back: line("M14 6L4 16l10 10M4 16h24"),
  go: line("M18 6l10 10-10 10M28 16H4"),
  down: line("M7 12l9 9 9-9"),
  up: line("M7 20l9-9 9 9"),
  close: line("M6 6l20 20M26 6L6 26"),
} as const satisfies Record<string, readonly Stroke[]>;

/** The icons that exist; a name that is not drawn does not compile. */
export type IconName = keyof typeof iconPaths;
