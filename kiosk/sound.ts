export type Sound = "accept" | "refuse" | "hold";

/** One knock on wood: its pitch, when it falls, how long it rings, how loud. */
interface Knock {
  hertz: number;
  afterMs: number;
  ringMs: number;
  gain: number;
}

/** DESIGN.md: accept one high tap, refuse two low knocks, hold one damped low note. */
const knocks: Record<Sound, readonly Knock[]> = {
  accept: [{ hertz: 1180, afterMs: 0, ringMs: 70, gain: 0.5 }],
  refuse: [
    { hertz: 190, afterMs: 0, ringMs: 90, gain: 0.8 },
    { hertz: 165, afterMs: 150, ringMs: 110, gain: 0.8 },
  ],
  hold: [{ hertz: 130, afterMs: 0, ringMs: 420, gain: 0.7 }],
};

let player: AudioContext | undefined;

/** Plays a sound; silently does nothing where the browser has none or wants a touch first. */
export function play(sound: Sound): void {
  if (typeof AudioContext === "undefined") return;
  player ??= new AudioContext();
  if (player.state === "suspended") player.resume().catch(() => undefined);
  for (const knock of knocks[sound]) strike(player, knock);
}

/** A struck bar: a fast attack, then an exponential decay, with a second partial of a wood block. */
function strike(context: AudioContext, { hertz, afterMs, ringMs, gain }: Knock): void {
  const start = context.currentTime + afterMs / 1000;
  const end = start + ringMs / 1000;
  for (const [ratio, share] of [
    [1, 1],
    [2.76, 0.3],
  ] as const) {
    const tone = context.createOscillator();
    const level = context.createGain();
    tone.frequency.value = hertz * ratio;
    level.gain.setValueAtTime(0.0001, start);
    level.gain.exponentialRampToValueAtTime(gain * share, start + 0.004);
    level.gain.exponentialRampToValueAtTime(0.0001, end);
    tone.connect(level).connect(context.destination);
    tone.start(start);
    tone.stop(end);
  }
}
