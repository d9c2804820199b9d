"use client";

import { useTranslations } from "use-intl";
import { Ask } from "@/components/bench/ask";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { SheetBar } from "@/components/sheet/sheet-bar";
import { SheetRows } from "@/components/sheet/sheet-rows";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Icon } from "@/components/ui/icon";
import type { Screen } from "@/lib/bench/schema";
import { actualMinutes, seamVerdict, standardMinutes } from "@/lib/seam/verdict";
import type { CellSheet } from "@/lib/sheet/cell-sheet";
import { sheetOnBench } from "@/lib/sheet/on-bench";
import { tappedOff } from "@/lib/sheet/order";
import { stepInHand } from "@/lib/taps/sheet";

interface SheetProps extends SeenBench {
  screen: Extract<Screen, { at: "sheet" }>;
}

/** The sheet of one instrument: its steps, each tapped off as it is done. */
export function SheetScreen(seen: SheetProps) {
  const { state, view, screen, tap } = seen;
  const sheet = sheetOnBench(state, view, screen.item);
  if (!sheet) return <KioskFrame state={state}>{null}</KioskFrame>;
  const inHand = stepInHand(screen, sheet);
  return (
    <KioskFrame state={state}>
      <div className="sheet">
        <Head {...seen} sheet={sheet} />
        <SheetRows sheet={sheet} inHand={inHand} picked={screen.picked} tap={tap} />
        <SheetBar {...seen} sheet={sheet} inHand={inHand} />
      </div>
    </KioskFrame>
  );
}

/** The instrument with its standard on the book's leaf, how far it is on the day's. */
function Head({ state, view, screen, sheet }: SheetProps & { sheet: CellSheet }) {
  const t = useTranslations("sheet");
  const clock = useClock();
  const { number, model, operation } = itemName(state, screen.item);
  const { standardSeconds, actualSeconds } = sheet;
  const began = view.since === null ? "" : t("since", { time: clock(view.since * 1000) });
  return (
    <section>
      <p className="mirror text-k-1 text-ink-2">
        <span className="truncate pr-6 pl-8 portrait:pl-6">
          <code>{number}</code>&ensp;{model}
        </span>
        <span className="truncate pr-8 pl-6 portrait:pr-6">
          {[began, t("tapped", tappedOff(sheet))].filter(Boolean).join(", ")}
        </span>
      </p>
      <Ask
        className="text-[32px] portrait:text-[29px]"
        book={
          standardSeconds === null
            ? `${operation}, ${t("noStandard")}`
            : t("whole", { operation, minutes: standardMinutes(standardSeconds) })
        }
        day={
          <span className="text-actual">
            {t("minutes", { minutes: actualMinutes(actualSeconds) })}
            <SoFar sheet={sheet} />
          </span>
        }
      />
    </section>
  );
}

/** How the time so far stands against the standards of what is tapped off; only where it is past. */
function SoFar({ sheet: { standardSeconds, actualSeconds } }: { sheet: CellSheet }) {
  const t = useTranslations("sheet");
  const verdict = seamVerdict({ standardSeconds, actualSeconds }, { finished: false });
  if (verdict.word === "left") return <>, {t("left", { minutes: verdict.minutes })}</>;
  if (verdict.word !== "over") return null;
  return (
    <span className="text-over">
      , <Icon name="over" className="inline-block size-9" />{" "}
      {t("over", { minutes: verdict.minutes })}
    </span>
  );
}
