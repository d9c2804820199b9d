"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { SeenBench } from "@/components/bench/seen";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import { showTicket } from "@/lib/codes/ticket-code";

const SHOWN = 4;

/** The end of a shift with work still open asks first: count it, or leave it open. */
export function EndOpenWorkScreen({ state, view, tap }: SeenBench) {
  const t = useTranslations("end");
  const words = useTranslations("common");
  const left = view.items.length - SHOWN;
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask className="pt-4 text-k-5" book={t("ask")} day={t("how")} />
        <Leaves
          className="pt-8"
          book={
            <ul className="grid gap-4 text-right text-k-3 font-semibold">
              {view.items.slice(0, SHOWN).map((item) => (
                <li key={`${item.ticket} ${item.operation}`}>
                  <code>{showTicket(item.ticket)}</code> {item.name}
                </li>
              ))}
              {left > 0 && <li>+ {left}</li>}
            </ul>
          }
          day={null}
        />
        <Foot
          book={
            <>
              <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
                {words("back")}
              </Plate>
              {view.doing?.kind === "work" && (
                <Plate icon="good" onClick={() => tap({ on: "count" })}>
                  {t("count")}
                </Plate>
              )}
            </>
          }
          day={
            <Plate
              icon="out"
              iconLast
              rim="right"
              tone="solid"
              onClick={() => tap({ on: "end-shift" })}
              className="text-k-4"
            >
              {t("end")}
            </Plate>
          }
        />
      </div>
    </KioskFrame>
  );
}
