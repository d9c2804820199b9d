import { Icon } from "@/components/ui/icon";
import type { IconName } from "@/components/ui/icon-paths";
import { type SeamPair, seamVerdict, type Verdict } from "@/lib/seam/verdict";
import { seamWord } from "@/lib/seam/words";

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

/** The verdict beside a gauge of a list: glyph, word and minutes. */
export function VerdictTag({ pair, finished }: { pair: SeamPair; finished: boolean }) {
  const verdict = seamVerdict(pair, { finished });
  const glyph = glyphs[verdict.word];
  return (
    <span className={`tag ${tones[verdict.word]}`}>
      {glyph && <Icon name={glyph} />}
      {seamWord(verdict)}
    </span>
  );
}
