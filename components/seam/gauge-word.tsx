import type { GaugeState } from "@/components/seam/gauge-kinds";
import { Icon } from "@/components/ui/icon";
import type { IconName } from "@/components/ui/icon-paths";
import type { SeamParts } from "@/lib/seam/parts";
import type { Verdict } from "@/lib/seam/verdict";
import { type SeamWords, seamWord } from "@/lib/seam/words";

const glyphs: Partial<Record<Verdict["word"], IconName>> = {
  over: "over",
  "no-standard": "no-standard",
};

/**
 * The verdict on a gauge's own drawing. Its room is what the drawing leaves: the unused standard,
 * else the leaf past the actual's end. Where the words do not fit there they stand above it, which
 * the stylesheet decides by the width of the room: words never lie on a dashed line.
 */
export function GaugeWord({
  parts,
  verdict,
  words,
  state,
}: {
  parts: SeamParts;
  verdict: Verdict;
  words: SeamWords;
  state: GaugeState;
}) {
  if (state === "other-work") return null;
  const from = parts.day + parts.over;
  const to = parts.hand > 0 ? parts.book : 1;
  const told = state === "held" || state === "paused" ? state : null;
  const glyph = told === "held" ? "clamp" : told === "paused" ? "pause" : glyphs[verdict.word];
  return (
    <span
      aria-hidden
      className="seam-room"
      data-word={told ?? verdict.word}
      data-open={parts.hand > 0 ? undefined : ""}
      style={{ left: `${50 + from * 50}%`, width: `${(to - from) * 50}%` }}
    >
      <span className="seam-word">
        {glyph && <Icon name={glyph} />}
        <span>
          {told ? `${words[told]}, ` : ""}
          {seamWord(verdict, words)}
        </span>
      </span>
    </span>
  );
}
