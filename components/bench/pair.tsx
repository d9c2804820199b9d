"use client";

import { useSeamWords } from "@/components/bench/words";
import { SeamGauge } from "@/components/seam/gauge";
import { seamScale } from "@/lib/seam/scale";
import { actualMinutes, type SeamPair, standardMinutes } from "@/lib/seam/verdict";

/** Standard and actual of one ticket operation with their figures: for a card that shows them once. */
export function Pair({
  pair,
  standard,
  actual,
  finished = false,
}: {
  pair: SeamPair;
  /** what follows the standard's figure: "min standard for 3 good" */
  standard: string;
  actual: string;
  finished?: boolean;
}) {
  const words = useSeamWords();
  const { standardSeconds, actualSeconds } = pair;
  return (
    <div className="grid gap-2 portrait:gap-11">
      <p className="mirror items-baseline text-k-2 font-semibold">
        <span className="pr-[26px] pl-8 text-standard-ink">
          {standardSeconds === null ? (
            words.noStandard
          ) : (
            <>
              {standard} <b className="text-k-5">{standardMinutes(standardSeconds)}</b>
            </>
          )}
        </span>
        <span className="pr-8 pl-[26px] text-actual">
          <b className="text-k-5">{actualMinutes(actualSeconds)}</b> {actual}
        </span>
      </p>
      <SeamGauge
        flush
        size="bench"
        state={finished ? "finished" : "live"}
        words={words}
        standardSeconds={standardSeconds}
        actualSeconds={actualSeconds}
        scaleSeconds={seamScale([pair])}
      />
    </div>
  );
}
