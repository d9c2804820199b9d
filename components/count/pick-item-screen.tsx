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
import { keyOf } from "@/lib/taps/moves";

const asks = { count: "whichDone", reassign: "whichWrong", sheet: "whichSheet" } as const;

/** Of several tickets on the bench, which one? */
export function PickItemScreen({
  state,
  view,
  tap,
  screen,
}: SeenBench & { screen: Extract<Screen, { at: "pick-item" }> }) {
  const t = useTranslations("pick");
  const words = useTranslations("common");
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask book={t(asks[screen.to])} />
        <Pages
          size={8}
          page={0}
          onPage={() => undefined}
          plates={view.items.map((item) => (
            <Plate
              key={`${item.ticket} ${item.operation}`}
              onClick={() => tap({ on: "pick-item", item: keyOf(item) })}
            >
              <code>{showTicket(item.ticket)}</code> {item.name}
              <small className="truncate">{modelName(item)}</small>
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
