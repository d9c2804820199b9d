"use client";

import { useTranslations } from "use-intl";
import type { SeenBench } from "@/components/bench/seen";
import { AcrossPlate, Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";
import type { CellSheet } from "@/lib/sheet/cell-sheet";
import { isOutOfOrder, stepAfter } from "@/lib/sheet/order";

interface BarProps extends SeenBench {
  screen: Extract<Screen, { at: "sheet" }>;
  sheet: CellSheet;
  inHand: string | null;
}

/** The acts on a sheet: back on the book's rim, the step in hand across the seam, stop on the day's. */
export function SheetBar(bar: BarProps) {
  if (bar.screen.isLocked) return <LockedBar {...bar} />;
  return (
    <div className="sheet-bar">
      <Before {...bar} />
      <Across {...bar} />
      <After {...bar} />
    </div>
  );
}

/** Nobody has touched it for a while: whose hand is it? The time runs on. */
function LockedBar({ tap }: BarProps) {
  const t = useTranslations("sheet");
  return (
    <div className="sheet-bar" role="status">
      <Plate icon="back" rim="left" onClick={() => tap({ on: "leave" })}>
        {t("leave")}
      </Plate>
      <p className="mirror items-center border-2 border-ink bg-raised text-k-3 font-bold">
        <span className="pr-6">{t("badge")}</span>
        <span className="pl-6 font-medium">{t("badgeHow")}</span>
      </p>
      <Plate icon="keys" rim="right" onClick={() => tap({ on: "key-pin" })}>
        {t("pin")}
      </Plate>
    </div>
  );
}

/** A picked step may not apply; else the last tap may be taken back, else it is one's bench. */
function Before({ state, tap, sheet, screen }: BarProps) {
  const t = useTranslations("sheet");
  const { picked } = screen;
  const step = sheet.steps.find((one) => one.step === picked);
  if (picked !== null && step?.state === "open") {
    return (
      <Plate icon="close" rim="left" onClick={() => tap({ on: "skip-step", step: picked })}>
        {t("doesNotApply")}
      </Plate>
    );
  }
  if (state.undo && state.undo.worker === state.visit?.worker) {
    const seconds = Math.max(1, Math.ceil((state.undo.untilMs - state.nowMs) / 1000));
    return (
      <Plate icon="undo" rim="left" onClick={() => tap({ on: "undo" })}>
        {t("undo")}
        <small>{t("undoLeft", { seconds })}</small>
      </Plate>
    );
  }
  return (
    <Plate icon="back" rim="left" onClick={() => tap({ on: "show-bench" })}>
      {t("myBench")}
    </Plate>
  );
}

function Across({ tap, sheet, inHand, screen }: BarProps) {
  const t = useTranslations("sheet");
  const place = sheet.steps.findIndex(({ step }) => step === inHand);
  const step = sheet.steps[place];
  if (!step) {
    return (
      <AcrossPlate icon="good" then={t("doneThen")} onClick={() => tap({ on: "count" })}>
        {t("done")}
      </AcrossPlate>
    );
  }
  const number = place + 1;
  if (step.state !== "open") {
    const then = step.state === "done" ? t("takeBackThen") : t("appliesThen");
    return (
      <AcrossPlate then={then} onClick={() => tap({ on: "take-back", step: step.step })}>
        {step.state === "done" ? t("takeBack", { number }) : t("applies", { number })}
      </AcrossPlate>
    );
  }
  const after = stepAfter(sheet);
  const then = isOutOfOrder(sheet, step.step)
    ? t("outOfOrder")
    : after && screen.picked === null
      ? t("thenStep", { step: after.name })
      : screen.picked === null
        ? t("last")
        : "";
  return (
    <AcrossPlate then={then} onClick={() => tap({ on: "tap-off", step: step.step })}>
      {t("tapOff", { number })}
    </AcrossPlate>
  );
}

function After({ tap, screen }: BarProps) {
  const t = useTranslations("sheet");
  if (screen.picked !== null) {
    return (
      <Plate icon="back" rim="right" onClick={() => tap({ on: "pick-step", step: null })}>
        {t("notThat")}
      </Plate>
    );
  }
  return (
    <Plate icon="pause" rim="right" onClick={() => tap({ on: "stop-here" })}>
      {t("stop")}
    </Plate>
  );
}
