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
import { DoorScreen } from "@/components/door/door-screen";
import { EnrolScreen } from "@/components/door/enrol-screen";
import { PinScreen } from "@/components/door/pin-screen";
import { StartShiftScreen } from "@/components/door/start-shift-screen";
import { Purfling } from "@/components/ui/purfling";
import { spokenLanguage } from "@/lib/bench/language";
import { type BenchView, benchView } from "@/lib/bench/view";

interface KioskScreenProps extends Seen {
  /** A code before the camera. */
  onText(text: string): void;
}

/** The screen of the present state: screens are states, not addresses, so that no network is asked. */
export function KioskScreen({ onText, ...seen }: KioskScreenProps) {
  const { state, tap } = seen;
  const { screen } = state;
  const view = state.visit && benchView(state, state.visit.worker);
  switch (screen.at) {
    case "loading":
      return (
        <div className="kiosk leaves">
          <Purfling />
        </div>
      );
    case "enrol":
      return <EnrolScreen tap={tap} screen={screen} />;
    case "door":
      return <DoorScreen {...seen} screen={screen} language={spokenLanguage(state)} />;
    case "pin":
      return <PinScreen {...seen} screen={screen} />;
    case "done":
      return <DoneScreen {...seen} view={view} screen={screen} />;
    default:
      return view && <BehindTheDoor {...seen} view={view} onText={onText} />;
  }
}

/** The screens of whoever stands here. */
function BehindTheDoor({ onText, ...seen }: KioskScreenProps & { view: BenchView }) {
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
