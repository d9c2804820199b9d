/** One key press as a wedge scanner types it. */
interface KeyPress {
  key: string;
  atMs: number;
}

/** What to do with a key press: the finished text of a scan, or nothing yet. */
export interface WedgeReader {
  /** Takes a key press; gives the whole text when a burst ends in Enter. */
  press(press: KeyPress): string | null;
  /** True while a burst runs: its keys are the scanner's and not a person's. */
  isBurst(): boolean;
}

/** Scanners type a character every 1 to 20 ms; nobody keys digits faster than about 60 ms apart. */
const LONGEST_GAP_MS = 40;
/** `W` or `T`, a digit and its check digit: nothing shorter is a code of ours. */
const SHORTEST_TEXT = 3;

/**
 * Tells a wedge scanner, which is a keyboard to the browser, from a person at the keys: by the
 * speed of the burst, and by the Enter that ends it.
 */
export function makeWedgeReader(): WedgeReader {
  let text = "";
  let lastMs = Number.NEGATIVE_INFINITY;
  return {
    press({ key, atMs }) {
      const isFast = atMs - lastMs <= LONGEST_GAP_MS;
      lastMs = atMs;
      if (!isFast) text = "";
      if (key === "Enter") {
        const whole = text;
        text = "";
        return whole.length >= SHORTEST_TEXT ? whole : null;
      }
      if (key.length === 1) text += key;
      return null;
    },
    isBurst: () => text.length > 1,
  };
}
