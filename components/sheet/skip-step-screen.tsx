"use client";

import { useTranslations } from "use-intl";
import type { SeenBench } from "@/components/bench/seen";
import { WhyScreen } from "@/components/sheet/why-screen";
import { useSkipReason } from "@/components/sheet/words";
import type { Screen } from "@/lib/bench/schema";
import { sheetOnBench } from "@/lib/sheet/on-bench";
import { skipReasons } from "@/lib/sheet/reasons";

/** A step that does not apply to this instrument is left out with a word why. */
export function SkipStepScreen({
  screen,
  ...seen
}: SeenBench & { screen: Extract<Screen, { at: "skip-step" }> }) {
  const t = useTranslations("sheet");
  const reasonWord = useSkipReason();
  const sheet = sheetOnBench(seen.state, seen.view, screen.item);
  const name = sheet?.steps.find(({ step }) => step === screen.step)?.name ?? screen.step;
  return (
    <WhyScreen
      {...seen}
      ask={t("whySkip")}
      what={name}
      reasons={skipReasons}
      wordOf={reasonWord}
      onReason={(reason) => seen.tap({ on: "skip-because", reason })}
    />
  );
}
