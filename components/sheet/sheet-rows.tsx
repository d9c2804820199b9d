"use client";

import { useTranslations } from "use-intl";
import { type Seen, useClock } from "@/components/bench/seen";
import { useSeamWords } from "@/components/bench/words";
import { SeamGauge } from "@/components/seam/gauge";
import { VerdictTag } from "@/components/seam/verdict-tag";
import { useSkipReason } from "@/components/sheet/words";
import { seamScale } from "@/lib/seam/scale";
import { actualMinutes, type SeamPair, standardMinutes } from "@/lib/seam/verdict";
import type { CellSheet, SheetStep } from "@/lib/sheet/cell-sheet";

interface RowsProps extends Pick<Seen, "tap"> {
  sheet: CellSheet;
  /** The step that the bar is about; null where none is left. */
  inHand: string | null;
  picked: string | null;
}

/** More rows than a screen has room for: those around the step in hand are shown. */
const ROWS_MAX = 10;

/** All steps on one scale: done ones with what they took, the one in hand with what runs. */
export function SheetRows({ sheet, inHand, picked, tap }: RowsProps) {
  const t = useTranslations("sheet");
  const pairs = sheet.steps.map((step) => pairOf(step, sheet, inHand));
  const scaleSeconds = seamScale(pairs);
  const at = sheet.steps.findIndex(({ step }) => step === inHand);
  const from = Math.max(0, Math.min(at - ROWS_MAX / 2, sheet.steps.length - ROWS_MAX));
  const shown = sheet.steps.slice(from, from + ROWS_MAX);
  const left = sheet.steps.length - shown.length;
  return (
    <div className="sheet-rows">
      <ol start={from + 1}>
        {shown.map((step, row) => (
          <li key={step.step}>
            <StepRow
              step={step}
              number={from + row + 1}
              pair={pairs[from + row]!}
              scaleSeconds={scaleSeconds}
              isInHand={step.step === inHand}
              isPicked={step.step === picked}
              onPick={() => tap({ on: "pick-step", step: step.step })}
            />
          </li>
        ))}
      </ol>
      {left > 0 && <p className="px-8 text-ink-2">{t("more", { count: left })}</p>}
    </div>
  );
}

/** What is not tapped off yet is shown at the step that it will belong to. */
function pairOf(step: SheetStep, sheet: CellSheet, inHand: string | null): SeamPair {
  const running = step.step === inHand && step.state === "open" ? sheet.notTappedSeconds : 0;
  return {
    standardSeconds: step.standardSeconds,
    actualSeconds: step.actualSeconds + running,
  };
}

function StepRow({
  step,
  number,
  pair,
  scaleSeconds,
  isInHand,
  isPicked,
  onPick,
}: {
  step: SheetStep;
  number: number;
  pair: SeamPair;
  scaleSeconds: number;
  isInHand: boolean;
  isPicked: boolean;
  onPick: () => void;
}) {
  const words = useSeamWords();
  const isShown = step.state !== "skipped" && (pair.actualSeconds > 0 || step.state === "done");
  const { standardSeconds } = pair;
  return (
    <button
      type="button"
      className="sheet-row"
      data-state={step.state}
      data-now={isInHand ? "" : undefined}
      aria-pressed={isPicked}
      aria-current={isInHand ? "step" : undefined}
      onClick={onPick}
    >
      <span className="sheet-book">
        <span className="text-ink-2">{number}</span>
        <span className="sheet-name">{step.name}</span>
        <b className="text-standard-ink">
          {standardSeconds === null ? "" : standardMinutes(standardSeconds)}
        </b>
      </span>
      <SeamGauge
        flush
        words={words}
        state={step.state === "done" ? "finished" : "live"}
        standardSeconds={standardSeconds}
        actualSeconds={pair.actualSeconds}
        scaleSeconds={scaleSeconds}
        className="sheet-gauge"
      />
      <span className="sheet-day">
        <b className="text-actual">{isShown ? actualMinutes(pair.actualSeconds) : ""}</b>
        <StepWord step={step} pair={pair} isInHand={isInHand} />
        <StepTime step={step} isInHand={isInHand} />
      </span>
    </button>
  );
}

function StepWord({
  step,
  pair,
  isInHand,
}: {
  step: SheetStep;
  pair: SeamPair;
  isInHand: boolean;
}) {
  const t = useTranslations("sheet");
  const words = useSeamWords();
  const skipReason = useSkipReason();
  if (step.state === "skipped") return <span>{skipReason(step.reason)}</span>;
  if (step.state === "done") {
    return (
      <span className="grid justify-items-start leading-tight">
        <VerdictTag finished pair={pair} words={words} />
        {step.together && <small>{t("together")}</small>}
      </span>
    );
  }
  if (isInHand && pair.actualSeconds > 0) {
    return <VerdictTag finished={false} pair={pair} words={words} />;
  }
  return <span className="text-ink-2">{step.atMs === null ? "" : t("again")}</span>;
}

function StepTime({ step, isInHand }: { step: SheetStep; isInHand: boolean }) {
  const t = useTranslations("sheet");
  const clock = useClock();
  if (step.state === "open") {
    return <span className="text-ink-2">{isInHand ? t("running") : ""}</span>;
  }
  return <span className="text-ink-2">{step.atMs === null ? "" : clock(step.atMs)}</span>;
}
