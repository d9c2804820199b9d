"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";

/** Which break: a rest on the book's leaf, a meal on the day's. */
export function BreakScreen({ state, tap }: Seen) {
  const t = useTranslations("breaks");
  const words = useTranslations("common");
  const rules = state.cell?.rules;
  const how = (key: "restHow" | "mealHow", seconds: number | undefined) =>
    seconds === undefined ? t("howPlain") : t(key, { minutes: Math.floor(seconds / 60) });
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask className="pt-4 text-k-5" book={t("ask")} />
        <Leaves
          className="content-center"
          book={
            <Plate
              icon="rest"
              rim="left"
              onClick={() => tap({ on: "break", break: "rest" })}
              className="big-plate"
            >
              {t("rest")}
              <small>{how("restHow", rules?.restMaxSeconds)}</small>
            </Plate>
          }
          day={
            <Plate
              icon="meal"
              rim="right"
              onClick={() => tap({ on: "break", break: "meal" })}
              className="big-plate"
            >
              {t("meal")}
              <small>{how("mealHow", rules?.mealMaxSeconds)}</small>
            </Plate>
          }
        />
        <Foot
          book={
            <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
              {words("back")}
            </Plate>
          }
        />
      </div>
    </KioskFrame>
  );
}
