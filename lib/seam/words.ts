import { actualMinutes, type SeamPair, standardMinutes, type Verdict } from "@/lib/seam/verdict";

/** What a gauge says, in one language. Numbers are whole minutes. */
export interface SeamWords {
  onStandard: string;
  noStandard: string;
  held: string;
  paused: string;
  rework: string;
  otherWork: string;
  over(minutes: number): string;
  left(minutes: number): string;
  under(minutes: number): string;
  /** the figures, for those who hear the gauge */
  standard(minutes: number): string;
  actual(minutes: number): string;
}

/** The words of the office, and the kiosk's in English. */
export const englishSeamWords: SeamWords = {
  onStandard: "on standard",
  noStandard: "no standard",
  held: "held",
  paused: "paused",
  rework: "rework",
  otherWork: "other work",
  over: (minutes) => `${minutes} over`,
  left: (minutes) => `${minutes} min left`,
  under: (minutes) => `${minutes} under`,
  standard: (minutes) => `${minutes} min standard`,
  actual: (minutes) => `${minutes} min actual`,
};

/** Puts a verdict in words: `14 over`, `17 min left`, `on standard`. */
export function seamWord(verdict: Verdict, words: SeamWords = englishSeamWords): string {
  switch (verdict.word) {
    case "on-standard":
      return words.onStandard;
    case "no-standard":
      return words.noStandard;
    default:
      return words[verdict.word](verdict.minutes);
  }
}

/** Speaks a pair's two figures: `48 min standard, 31 min actual`; one where there is no standard. */
export function seamFigures(
  { standardSeconds, actualSeconds }: SeamPair,
  words: SeamWords = englishSeamWords,
): string {
  const actual = words.actual(actualMinutes(actualSeconds));
  if (standardSeconds === null) return actual;
  return `${words.standard(standardMinutes(standardSeconds))}, ${actual}`;
}
