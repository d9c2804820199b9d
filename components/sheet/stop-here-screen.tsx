"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { SeenBench } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Board, Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";
import { sheetOnBench, sheetsToGoOn } from "@/lib/sheet/on-bench";

/** Stop here: for a while on the book's leaf, for another day or for good on the day's. */
export function StopHereScreen({
  state,
  view,
  tap,
  screen,
}: SeenBench & { screen: Extract<Screen, { at: "stop-here" }> }) {
  const t = useTranslations("stop");
  const words = useTranslations("common");
  const sheet = sheetOnBench(state, view, screen.item);
  const open = sheet?.steps.filter((step) => step.state === "open").length ?? 0;
  const others = sheetsToGoOn(state, state.visit?.worker ?? "", view).length;
  const { number, operation } = itemName(state, screen.item);
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask
          className="pt-2 text-k-4"
          book={t("ask")}
          day={
            <span className="font-medium">
              <code>{number}</code> {operation}
            </span>
          }
        />
        <Leaves
          className="content-center"
          book={
            <Board stacked className="pages-leaf stop-board" data-side="book">
              <Plate icon="rest" onClick={() => tap({ on: "show-break" })}>
                {t("break")}
                <small>{t("breakHow")}</small>
              </Plate>
              <Plate icon="change" onClick={() => tap({ on: "show-other-sheets" })}>
                {t("other")}
                <small>{t("otherHow", { count: others })}</small>
              </Plate>
              <Plate icon="other-work" onClick={() => tap({ on: "show-other-work" })}>
                {t("otherWork")}
                <small>{t("otherWorkHow")}</small>
              </Plate>
            </Board>
          }
          day={
            <Board stacked className="pages-leaf stop-board" data-side="day">
              <Plate icon="pause" onClick={() => tap({ on: "put-aside" })}>
                {t("pause")}
                <small>{t("pauseHow")}</small>
              </Plate>
              <Plate icon="people" onClick={() => tap({ on: "show-hand-over" })}>
                {t("handOver")}
                <small>{t("handOverHow")}</small>
              </Plate>
              <Plate icon="good" onClick={() => tap({ on: "count" })}>
                {t("finish")}
                <small>{t("finishHow", { count: open })}</small>
              </Plate>
            </Board>
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
