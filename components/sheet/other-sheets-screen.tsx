"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import type { SeenBench } from "@/components/bench/seen";
import { modelName } from "@/components/bench/words";
import { Pages } from "@/components/choose/pages";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";
import { sheetOnBench, sheetsToGoOn } from "@/lib/sheet/on-bench";
import { tappedOff } from "@/lib/sheet/order";

const PAGE_SIZE = 7;

/** The instruments that are begun: each goes on where it stands, or another ticket is scanned. */
export function OtherSheetsScreen({
  state,
  view,
  tap,
  screen,
}: SeenBench & { screen: Extract<Screen, { at: "other-sheets" }> }) {
  const t = useTranslations("stop");
  const words = useTranslations("common");
  const others = sheetsToGoOn(state, state.visit?.worker ?? "", view);
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask
          book={others.length > 0 ? t("which") : t("none")}
          day={<span className="font-medium">{others.length > 0 ? t("whichHow") : ""}</span>}
        />
        <Pages
          size={PAGE_SIZE}
          page={screen.page}
          onPage={(page) => tap({ on: "page", page })}
          plates={others.map((other) => (
            <Plate
              key={`${other.ticket} ${other.operation}`}
              onClick={() => tap({ on: "go-on", item: other })}
            >
              <code>{showTicket(other.ticket)}</code> {modelName(other)}
              <small>
                {t("tapped", tappedOff(sheetOnBench(state, view, other) ?? other.sheet))}
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
          day={
            <Plate
              icon="scan"
              iconLast
              rim="right"
              onClick={() => tap({ on: "scan-for", add: false })}
            >
              {t("scan")}
            </Plate>
          }
        />
      </div>
    </KioskFrame>
  );
}
