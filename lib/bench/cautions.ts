/** A safety sign: `w-` beware (yellow triangle), `m-` must (blue disc), `p-` must not. */
type SignName =
  | "w-flame"
  | "w-ex"
  | "w-hot"
  | "w-crush"
  | "w-rollers"
  | "w-general"
  | "m-mask"
  | "m-dust"
  | "m-eyes"
  | "m-ears"
  | "m-gloves"
  | "p-gloves";

/** A hazard's caution: what to beware of, and what to wear or to leave off. */
export interface Caution {
  warns: readonly { sign: SignName; words: CautionWords }[];
  wears: readonly { sign: SignName; words: CautionWords }[];
}

/** The keys of the words in `lib/messages`, section `caution`. */
type CautionWords =
  | "lacquerBurns"
  | "vapourExplodes"
  | "vapourHarms"
  | "fumesHarm"
  | "dustHarms"
  | "dustBurns"
  | "noiseHarms"
  | "hotBurns"
  | "rollersCatch"
  | "pressCrushes"
  | "staticSparks"
  | "generalHazard"
  | "respirator"
  | "dustMask"
  | "goggles"
  | "earProtection"
  | "nitrileGloves"
  | "heatGloves"
  | "noLooseGloves";

/** The usual cautions of the trade (common practice); the site's own rules come first. */
const cautions: Record<string, Caution> = {
  dust: {
    warns: [
      { sign: "w-general", words: "dustHarms" },
      { sign: "w-flame", words: "dustBurns" },
    ],
    wears: [
      { sign: "m-dust", words: "dustMask" },
      { sign: "m-eyes", words: "goggles" },
    ],
  },
  noise: {
    warns: [{ sign: "w-general", words: "noiseHarms" }],
    wears: [{ sign: "m-ears", words: "earProtection" }],
  },
  solvent: {
    warns: [{ sign: "w-flame", words: "vapourHarms" }],
    wears: [
      { sign: "m-gloves", words: "nitrileGloves" },
      { sign: "m-eyes", words: "goggles" },
    ],
  },
  spray: {
    warns: [
      { sign: "w-flame", words: "lacquerBurns" },
      { sign: "w-ex", words: "vapourExplodes" },
    ],
    wears: [
      { sign: "m-mask", words: "respirator" },
      { sign: "m-eyes", words: "goggles" },
      { sign: "m-gloves", words: "nitrileGloves" },
    ],
  },
  fumes: {
    warns: [{ sign: "w-general", words: "fumesHarm" }],
    wears: [{ sign: "m-mask", words: "respirator" }],
  },
  static: { warns: [{ sign: "w-ex", words: "staticSparks" }], wears: [] },
  "hot-surface": {
    warns: [{ sign: "w-hot", words: "hotBurns" }],
    wears: [{ sign: "m-gloves", words: "heatGloves" }],
  },
  rollers: {
    warns: [{ sign: "w-rollers", words: "rollersCatch" }],
    wears: [
      { sign: "m-eyes", words: "goggles" },
      { sign: "p-gloves", words: "noLooseGloves" },
    ],
  },
  crush: {
    warns: [{ sign: "w-crush", words: "pressCrushes" }],
    wears: [],
  },
};

const unknownHazard: Caution = {
  warns: [{ sign: "w-general", words: "generalHazard" }],
  wears: [],
};

/** Raised when the words of any caution change: everyone then answers once more. */
const WORDS_VERSION = 1;

/** The version of an operation's caution, as `caution-read` names it: its hazards and their words. */
export function cautionVersion(hazards: readonly string[]): string {
  const named = [...hazards].sort().join("+");
  return `${WORDS_VERSION}:${named}`.slice(0, 64);
}

/** Joins the cautions of several hazards into one card; what two of them ask is said once. */
export function cautionOf(hazards: readonly string[]): Caution {
  const found = hazards.map((hazard) => cautions[hazard] ?? unknownHazard);
  return {
    warns: onceEach(found.flatMap(({ warns }) => warns)),
    wears: onceEach(found.flatMap(({ wears }) => wears)),
  };
}

function onceEach<T extends { words: string }>(lines: readonly T[]): T[] {
  return [...new Map(lines.map((line) => [line.words, line])).values()];
}
