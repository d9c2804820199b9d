import type { CSSProperties } from "react";
import { GaugeDrawing, PaperDrawing } from "@/components/seam/gauge-drawing";
import type { GaugeSize, GaugeState } from "@/components/seam/gauge-kinds";
import { GaugeWord } from "@/components/seam/gauge-word";
import { seamParts } from "@/lib/seam/parts";
import { type SeamPair, seamVerdict, TOLERANCE_PERCENT } from "@/lib/seam/verdict";
import { englishSeamWords, type SeamWords, seamFigures, seamWord } from "@/lib/seam/words";

export interface SeamGaugeProps extends SeamPair {
  /** seconds that one leaf is long: one scale a list, from `seamScale` */
  scaleSeconds: number;
  size?: GaugeSize;
  state?: GaugeState;
  /** the work is rework: its grain runs across */
  rework?: boolean;
  /** no line of its own at the seam: the page's purfling runs over it */
  flush?: boolean;
  words?: SeamWords;
  tolerancePercent?: number;
  /** what the gauge is of, said before its figures: `Fret press and level` */
  name?: string;
  className?: string;
}

const flag = (on: boolean) => (on ? "" : undefined);

/**
 * The seam gauge: standard on the left, the same work's actual on the right, mirrored about the
 * seam on one scale. The drawing never depends on tolerance, only the words do. Sizes `phone` and
 * `bench` say their verdict on the drawing; elsewhere a column beside it does.
 */
export function SeamGauge({
  scaleSeconds,
  size = "row",
  state = "finished",
  rework = false,
  flush = false,
  words = englishSeamWords,
  tolerancePercent = TOLERANCE_PERCENT,
  name,
  className = "",
  ...pair
}: SeamGaugeProps) {
  const parts = seamParts(pair, scaleSeconds);
  const verdict = seamVerdict(pair, { finished: state === "finished", tolerancePercent });
  const blank = pair.standardSeconds === null;
  const spoken = [
    name,
    seamFigures(pair, words),
    state === "other-work" ? words.otherWork : seamWord(verdict, words),
    (state === "held" || state === "paused") && words[state],
    rework && words.rework,
  ];
  return (
    <span
      role="img"
      aria-label={spoken.filter(Boolean).join(", ")}
      className={`seam ${className}`}
      data-size={size}
      data-state={state}
      data-rework={flag(rework)}
      data-blank={flag(blank)}
      data-flush={flag(flush)}
      style={{ "--scale": scaleSeconds / 60 } as CSSProperties}
    >
      {size === "paper" ? (
        <PaperDrawing parts={parts} />
      ) : (
        <GaugeDrawing parts={parts} blank={blank} state={state} />
      )}
      {(size === "phone" || size === "bench") && (
        <GaugeWord parts={parts} verdict={verdict} words={words} state={state} />
      )}
    </span>
  );
}
