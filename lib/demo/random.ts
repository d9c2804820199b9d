import { v7 } from "uuid";
import { assert } from "@/lib/assert";
import { sum } from "@/lib/sum";

/** A stream of chance that is the same each time for the same seed. */
export interface Random {
  /** A number from 0 up to, not including, 1. */
  next(): number;
  /** A number from `min` up to, not including, `max`. */
  between(min: number, max: number): number;
  /** A whole number from `min` to `max`, both included. */
  whole(min: number, max: number): number;
  /** True with the given chance: 0 never, 1 always. */
  chance(share: number): boolean;
  /** One of the list; each is equally likely. */
  pick<T>(list: readonly T[]): T;
  /** One of the list, each as likely as its weight says; not all weights are 0. */
  pickBy<T>(list: readonly T[], weightOf: (item: T) => number): T;
  /** A factor around 1 such as work times have: log-normal, median 1, `spread` its sigma. */
  spread(spread: number): number;
}

/**
 * Opens a stream of chance for a seed (xmur3 into sfc32, from memory: small, fast and good enough
 * for a scenario; no secret may come from it). Streams of different seeds are unrelated, so each
 * part of the scenario has its own and a change in one does not stir the others.
 */
export function randomFrom(seed: string): Random {
  const next = sfc32(seed);
  const between = (min: number, max: number) => min + next() * (max - min);
  const whole = (min: number, max: number) => Math.floor(between(min, max + 1));
  return {
    next,
    between,
    whole,
    chance: (share) => next() < share,
    pick: (list) => {
      assert(list.length > 0, "pick: needs something to pick from");
      return list[whole(0, list.length - 1)]!;
    },
    pickBy: (list, weightOf) => {
      let left = next() * sum(list.map(weightOf));
      const picked = list.find((item) => {
        left -= weightOf(item);
        return left < 0;
      });
      assert(picked !== undefined, "pickBy: needs something to pick from");
      return picked;
    },
    spread: (spread) => Math.exp(spread * normal(next)),
  };
}

/** A UUIDv7 of an instant whose random part comes from the stream. */
export function uuidAt(atMs: number, random: Random): string {
  return v7({ msecs: atMs, seq: random.whole(0, 0x7fffffff), random: bytes(random) });
}

function bytes(random: Random): Uint8Array {
  return Uint8Array.from({ length: 16 }, () => random.whole(0, 255));
}

/** Box–Muller: one standard normal value out of two even ones. */
function normal(next: () => number): number {
  return Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());
}

function sfc32(seed: string): () => number {
  const hash = xmur3(seed);
  let [a, b, c, d] = [hash(), hash(), hash(), hash()];
  return () => {
    const t = (a + b + d) | 0;
    d = (d + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = ((c << 21) | (c >>> 11)) + t;
    return (t >>> 0) / 4294967296;
  };
}

function xmur3(text: string): () => number {
  let h = 1779033703 ^ text.length;
  for (const char of text) {
    h = Math.imul(h ^ char.charCodeAt(0), 3432918353);
    h = (h << 13) | (h >>> 19);
  }
  return () => {
    h = Math.imul(h ^ (h >>> 16), 2246822507);
    h = Math.imul(h ^ (h >>> 13), 3266489909);
    h ^= h >>> 16;
    return h;
  };
}
