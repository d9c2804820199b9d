/** How an instrument is built; it decides which operations its routing has. */
export type Build = "flat-top" | "archtop" | "solid";

/** A model of Larkmoor Stringworks. Everything here is invented. */
export interface DemoModel {
  name: string;
  /** What kind of instrument it is, in words for a screen. */
  kind: string;
  build: Build;
  /** True where it carries pickups. */
  electric: boolean;
  /** True where one technician assembles the whole instrument, step by step. */
  whole: boolean;
  /** Work content against the ordinary instrument of its build: 1 is ordinary. */
  effort: number;
  /** Its share of new tickets; the seven sum to 1. */
  share: number;
  /** Lot sizes; one is picked for each ticket. */
  lots: readonly number[];
  /** Finishes and the like that an order chooses; the second adds work where `adders` say so. */
  options: readonly string[];
}

/** The model that came to the floor a few weeks ago and is still being learnt. */
export const NEW_MODEL = "Curlew";

export const models: readonly DemoModel[] = [
  {
    name: "Heron",
    kind: "Grand auditorium guitar",
    build: "flat-top",
    electric: false,
    whole: false,
    effort: 1,
    share: 0.24,
    lots: [6, 8, 8, 12],
    options: ["Natural satin", "Sunburst gloss"],
  },
  {
    name: "Wren",
    kind: "Parlour guitar",
    build: "flat-top",
    electric: false,
    whole: false,
    effort: 0.9,
    share: 0.17,
    lots: [6, 6, 8],
    options: ["Cherry satin", "Natural gloss"],
  },
  {
    name: "Avocet",
    kind: "Archtop guitar",
    build: "archtop",
    electric: true,
    whole: true,
    effort: 1.35,
    share: 0.09,
    lots: [1, 1, 1, 2],
    options: ["Amber gloss", "Walnut gloss"],
  },
  {
    name: "Dipper",
    kind: "Cutaway guitar with pickup",
    build: "flat-top",
    electric: true,
    whole: false,
    effort: 1.08,
    share: 0.14,
    lots: [1, 2, 4, 6],
    options: ["Natural satin", "Smoke burst gloss"],
  },
  {
    name: "Kestrel",
    kind: "Electric guitar",
    build: "solid",
    electric: true,
    whole: false,
    effort: 0.96,
    share: 0.2,
    lots: [8, 8, 12],
    options: ["Spruce green", "Oxblood burst"],
  },
  {
    name: "Curlew",
    kind: "Baritone guitar",
    build: "solid",
    electric: true,
    whole: false,
    effort: 1.12,
    share: 0.07,
    lots: [1, 2, 4],
    options: ["Slate", "Fen burst"],
  },
  {
    name: "Plover",
    kind: "Bass guitar",
    build: "solid",
    electric: true,
    whole: true,
    effort: 1.1,
    share: 0.09,
    lots: [1, 1, 1, 2],
    options: ["Tobacco burst", "Bone white"],
  },
];
