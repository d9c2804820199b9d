"use client";

import { useTranslations } from "use-intl";
import { DeedWords } from "@/components/acts/deed-words";
import { DoneGauge } from "@/components/acts/done-gauge";
import { Foot } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { UndoBar } from "@/components/bench/undo-bar";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";

/** What was done, in one look; it may be taken back, and the door comes by itself. */
export function DoneScreen({
  state,
  view,
  tap,
  screen,
}: Seen & { view: BenchView | null; screen: Extract<Screen, { at: "done" }> }) {
  const t = useTranslations("done");
  const { deed } = screen;
  const isIn = state.visit !== null && deed.what !== "shift-end";
  const isFree = isIn && view?.doing?.kind === "unassigned";
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[minmax(0,1fr)_112px_auto]">
        <div className="grid content-center gap-9">
          <DeedWords state={state} deed={deed} />
          <DoneGauge state={state} view={view} deed={deed} />
        </div>
        <div className="grid px-8 portrait:px-6">
          <UndoBar state={state} tap={tap} />
        </div>
        <Foot
          book={
            isIn && (
              <Plate icon="back" rim="left" onClick={() => tap({ on: "stay" })}>
                {t("bench")}
              </Plate>
            )
          }
          day={
            <>
              {isFree && (
                <Plate icon="scan" tone="solid" onClick={() => tap({ on: "scan-for", add: false })}>
                  {t("next")}
                </Plate>
              )}
              <Plate icon="go" iconLast rim="right" onClick={() => tap({ on: "leave" })}>
                {t("leave")}
              </Plate>
            </>
          }
        />
      </div>
    </KioskFrame>
  );
}
