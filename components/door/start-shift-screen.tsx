"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { AcrossPlate, Plate } from "@/components/ui/plate";

/** Where no shift is open: one tap starts it. A kiosk that cannot know offers both. */
export function StartShiftScreen({ state, view, tap }: SeenBench) {
  const t = useTranslations("shift");
  const words = useTranslations("common");
  const clock = useClock();
  const { planned, isKnown } = view;
  const plan = planned
    ? t("planned", { start: clock(planned.start * 1000), end: clock(planned.end * 1000) })
    : t("unplanned");
  return (
    <KioskFrame state={state}>
      <div className="grid grid-rows-[1fr_auto_1fr_auto]">
        <Ask
          className="self-end pb-8 text-k-5"
          book={isKnown ? t("title") : t("unknown")}
          day={isKnown ? plan : t("unknownHow")}
        />
        <div className="px-8 portrait:px-6">
          <AcrossPlate
            icon="in"
            then={t("startAt", { time: clock(state.nowMs) })}
            onClick={() => tap({ on: "start-shift" })}
            className="min-h-[168px] w-full"
          >
            {t("start")}
          </AcrossPlate>
        </div>
        <span />
        <Foot
          book={
            <Plate icon="back" rim="left" onClick={() => tap({ on: "leave" })}>
              {words("leave")}
            </Plate>
          }
          day={
            !isKnown && (
              <Plate icon="go" iconLast rim="right" onClick={() => tap({ on: "say-in" })}>
                {t("alreadyIn")}
              </Plate>
            )
          }
        />
      </div>
    </KioskFrame>
  );
}
