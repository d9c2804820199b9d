"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { Pages } from "@/components/choose/pages";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";

/** The latest counts of a shift fit one page; an older one is for the lead. */
const SHOWN = 8;

/** Which count is not right? The lead looks at it. */
export function PickReportScreen({ state, view, tap }: SeenBench) {
  const t = useTranslations("hours");
  const words = useTranslations("common");
  const clock = useClock();
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask book={t("whichCount")} />
        <Pages
          size={SHOWN}
          page={0}
          onPage={() => undefined}
          plates={view.reports
            .toReversed()
            .slice(0, SHOWN)
            .map((report) => (
              <Plate key={report.event} onClick={() => tap({ on: "object", report: report.event })}>
                <code>{itemName(state, report).number}</code> {itemName(state, report).operation}
                <small>
                  {t("countLine", {
                    good: report.good,
                    rework: report.rework,
                    scrap: report.scrap,
                  })}{" "}
                  {t("at", { time: clock(report.atMs) })}
                </small>
              </Plate>
            ))}
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
