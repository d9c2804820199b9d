import type { Random } from "@/lib/demo/random";

/** What was wrong with a piece, and the operation that caused it. */
export interface Fault {
  causedBy: string;
  defect: string;
}

/** What each inspection point finds, and where it comes from. */
const found: Record<string, readonly Fault[]> = {
  "200": [
    { causedBy: "180", defect: "glue-gap" },
    { causedBy: "160", defect: "scorch" },
    { causedBy: "190", defect: "tear-out" },
  ],
  "330": [
    { causedBy: "280", defect: "high-fret" },
    { causedBy: "300", defect: "out-of-profile" },
  ],
  "350": [
    { causedBy: "340", defect: "sanding-mark" },
    { causedBy: "320", defect: "sanding-mark" },
    { causedBy: "230", defect: "binding-gap" },
  ],
  "420": [
    { causedBy: "390", defect: "run" },
    { causedBy: "390", defect: "sink" },
    { causedBy: "410", defect: "sand-through" },
  ],
  "510": [
    { causedBy: "450", defect: "cold-joint" },
    { causedBy: "430", defect: "out-of-phase" },
  ],
  "580": [
    { causedBy: "520", defect: "buzz" },
    { causedBy: "530", defect: "string-spacing" },
    { causedBy: "410", defect: "scratch" },
    { causedBy: "560", defect: "high-action" },
  ],
};

/** What someone finds on the own work. */
const own: Record<string, string> = {
  Timber: "check",
  Machining: "tear-out",
  Body: "glue-gap",
  Binding: "binding-gap",
  Neck: "out-of-profile",
  Finish: "run",
  Electrics: "cold-joint",
  Assembly: "misfit",
  "Set-up": "buzz",
};

/**
 * Finds a fault for a piece that was turned back at an operation. Only operations that the piece has
 * been through can have caused it; where none of the usual ones was, it is the operation itself.
 */
export function faultAt(
  at: { code: string; stage: string },
  behind: readonly string[],
  random: Random,
): Fault {
  const likely = (found[at.code] ?? []).filter(({ causedBy }) => behind.includes(causedBy));
  if (likely.length > 0) return random.pick(likely);
  return { causedBy: at.code, defect: own[at.stage] ?? "other" };
}
