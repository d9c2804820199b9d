"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { useOtherWork } from "@/components/bench/words";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";
import { otherWorkCodes } from "@/lib/ledger/other-work";

/** Other work, all kinds on one page: time that belongs to no ticket. */
export function OtherWorkScreen({
  state,
  tap,
  screen,
}: Seen & { screen: Extract<Screen, { at: "other-work" }> }) {
  const t = useTranslations("other");
  const words = useTranslations("common");
  const otherWork = useOtherWork();
  const codes: readonly string[] = state.cell?.otherWork.length
    ? state.cell.otherWork
    : otherWorkCodes;
  const half = Math.ceil(codes.length / 2);
  const plate = (code: string) => (
    <Plate key={code} onClick={() => tap({ on: "other-work", code })}>
      {otherWork(code)}
    </Plate>
  );
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask book={screen.purpose.for === "reassign" ? t("askRight") : t("ask")} />
        <div className="code-leaves">
          <div data-side="book">{codes.slice(0, half).map(plate)}</div>
          <div data-side="day">{codes.slice(half).map(plate)}</div>
        </div>
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
