import { hoursAndMinutes } from "@/lib/time/format";

/** A length to the second, for figures that must be provable: "7 h 05 min", "12 min 30 s", "9 s". */
export function exactLength(seconds: number): string {
  const left = seconds % 60;
  if (left === 0) return hoursAndMinutes(seconds);
  return seconds < 60 ? `${left} s` : `${hoursAndMinutes(seconds)} ${left} s`;
}
