import { hourWords } from "@/components/seam/verdict-tag";
import type { SeamWords } from "@/lib/seam/words";

const hours = (minutes: number) => `${(minutes / 60).toFixed(1)} h`;

/** What a gauge says of a plan and what was tapped; nothing here is a standard. */
export const plannedWords: SeamWords = {
  ...hourWords,
  onStandard: "as planned",
  noStandard: "not planned",
  standard: (minutes) => `${hours(minutes)} planned`,
  actual: (minutes) => `${hours(minutes)} tapped`,
};
