"use client";

import { BreakScreen } from "@/components/acts/break-screen";
import { DoneScreen } from "@/components/acts/done-screen";
import { EndOpenWorkScreen } from "@/components/acts/end-open-work-screen";
import { HoursScreen } from "@/components/acts/hours-screen";
import { OtherWorkScreen } from "@/components/acts/other-work-screen";
import { PickReportScreen } from "@/components/acts/pick-report-screen";
import { BenchScreen } from "@/components/bench/bench-screen";
import type { Seen } from "@/components/bench/seen";
import { CautionScreen } from "@/components/choose/caution-screen";
import { CellTicketsScreen } from "@/components/choose/cell-tickets-screen";
import { OfferScreen } from "@/components/choose/offer-screen";
import { RefusedScreen } from "@/components/choose/refused-screen";
import { ScanScreen } from "@/components/choose/scan-screen";
import { CauseScreen } from "@/components/count/cause-screen";
import { CountScreen } from "@/components/count/count-screen";
import { PickItemScreen } from "@/components/count/pick-item-screen";
import { ScrapScreen } from "@/components/count/scrap-screen";
import { StartShiftScreen } from "@/components/door/start-shift-screen";
import { HandedScreen, HandOverScreen } from "@/components/sheet/hand-over-screen";
import { OtherSheetsScreen } from "@/components/sheet/other-sheets-screen";
import { SheetScreen } from "@/components/sheet/sheet-screen";
import { SkipStepScreen } from "@/components/sheet/skip-step-screen";
import { StopHereScreen } from "@/components/sheet/stop-here-screen";
import { type BenchView, benchView } from "@/lib/bench/view";

interface KioskScreenProps extends Seen {
  /** A code before the camera. */
  onText(text: string): void;
}

/** The screens of whoever stands here; they come after the door's own, in a script of their own. */
export function BehindTheDoor({ onText, ...seen }: KioskScreenProps) {
  const { state } = seen;
  const view = state.visit && benchView(state, state.visit.worker);
  if (state.screen.at === "done") return <DoneScreen {...seen} view={view} screen={state.screen} />;
  return view && <Screen {...seen} view={view} onText={onText} />;
}

function Screen({ onText, ...seen }: KioskScreenProps & { view: BenchView }) {
  const { screen } = seen.state;
  switch (screen.at) {
    case "start-shift":
      return <StartShiftScreen {...seen} />;
    case "bench":
      return <BenchScreen {...seen} />;
    case "scan":
      return <ScanScreen {...seen} screen={screen} onText={onText} />;
    case "cell-tickets":
      return <CellTicketsScreen {...seen} screen={screen} />;
    case "offer":
      return <OfferScreen {...seen} screen={screen} />;
    case "refused":
      return <RefusedScreen {...seen} screen={screen} />;
    case "caution":
      return <CautionScreen {...seen} screen={screen} />;
    case "pick-item":
      return <PickItemScreen {...seen} screen={screen} />;
    case "sheet":
      return <SheetScreen {...seen} screen={screen} />;
    case "skip-step":
      return <SkipStepScreen {...seen} screen={screen} />;
    case "stop-here":
      return <StopHereScreen {...seen} screen={screen} />;
    case "other-sheets":
      return <OtherSheetsScreen {...seen} screen={screen} />;
    case "hand-over":
      return <HandOverScreen {...seen} screen={screen} />;
    case "handed":
      return <HandedScreen {...seen} screen={screen} />;
    case "count":
      return <CountScreen {...seen} screen={screen} />;
    case "cause":
      return <CauseScreen {...seen} screen={screen} />;
    case "scrap":
      return <ScrapScreen {...seen} screen={screen} />;
    case "break":
      return <BreakScreen {...seen} />;
    case "other-work":
      return <OtherWorkScreen {...seen} screen={screen} />;
    case "hours":
      return <HoursScreen {...seen} />;
    case "pick-report":
      return <PickReportScreen {...seen} />;
    case "end-open-work":
      return <EndOpenWorkScreen {...seen} />;
    default:
      return null;
  }
}
