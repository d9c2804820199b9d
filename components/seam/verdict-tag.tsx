import { Icon } from "@/components/ui/icon";
import type { IconName } from "@/components/ui/icon-paths";
import { type SeamPair, seamVerdict, type Verdict } from "@/lib/seam/verdict";
import { englishSeamWords, type SeamWords, seamWord } from "@/lib/seam/words";

const glyphs: Record<Verdict["word"], IconName | null> = {
  "on-standard": "on-standard",
  over: "over",
  under: "under",
  left: null,
  "no-standard": "no-standard",
};

const tones: Record<Verdict["word"], string> = {
  "on-standard": "text-ink-2",
  over: "text-over",
  under: "text-actual",
  left: "",
  "no-standard": "text-ink-2",
};

const hours = (minutes: number) => `${(minutes / 60).toFixed(1)} h`;

/** The verdict in hours with one decimal, for lists whose scale is in hours. */
export const hourWords: SeamWords = {
  ...englishSeamWords,
  over: (minutes) => `${hours(minutes)} over`,
  left: (minutes) => `${hours(minutes)} left`,
  under: (minutes) => `${hours(minutes)} under`,
  standard: (minutes) => `${hours(minutes)} standard`,
  actual: (minutes) => `${hours(minutes)} actual`,
};

/** The verdict beside a gauge of a list: glyph, word and figure. */
export function VerdictTag({
  pair,
  finished,
  words = englishSeamWords,
}: {
  pair: SeamPair;
  finished: boolean;
  words?: SeamWords;
}) {
  const verdict = seamVerdict(pair, { finished });
  const glyph = glyphs[verdict.word];
  return (
    <span className={`tag ${tones[verdict.word]}`}>
      {glyph && <Icon name={glyph} />}
      {seamWord(verdict, words)}
    </span>
  );
}
