"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import { Sign } from "@/components/ui/sign";
import { cautionOf } from "@/lib/bench/cautions";
import { findOperation } from "@/lib/bench/offers";
import type { Screen } from "@/lib/bench/schema";

/** Before a hazard: what to beware of, what to wear; answered once per shift and operation. */
export function CautionScreen({
  state,
  tap,
  screen,
}: Seen & { screen: Extract<Screen, { at: "caution" }> }) {
  const t = useTranslations("caution");
  const { choice } = screen;
  const { warns, wears } = cautionOf(findOperation(state, choice)?.hazards ?? []);
  const name = itemName(state, choice);
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto_auto]">
        <Ask
          className="pt-2 text-k-5"
          book={
            <>
              <span className="block text-k-2 font-medium">
                <code>{name.number}</code>&ensp;{name.model}
              </span>
              {name.operation}
            </>
          }
          day={t("ask", { count: wears.length })}
        />
        <div
          className="caution-leaves"
          data-many={Math.max(warns.length, wears.length) > 3 ? "" : undefined}
        >
          <ul className="caution-warns">
            {warns.map(({ sign, words }) => (
              <li key={words}>
                <span>{t(words)}</span>
                <Sign name={sign} />
              </li>
            ))}
          </ul>
          <ul className="caution-wears">
            {wears.map(({ sign, words }) => (
              <li key={words}>
                <Sign name={sign} />
                <span>{t(words)}</span>
              </li>
            ))}
          </ul>
        </div>
        <p className="mirror pb-1 text-k-1 text-ink-2">
          <span />
          <span className="pr-8 pl-[26px]">{t("rules")}</span>
        </p>
        <Foot
          book={
            <>
              <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
                {t("notNow")}
              </Plate>
              <Plate icon="lead" onClick={() => tap({ on: "call-lead" })}>
                {t("kitMissing")}
              </Plate>
            </>
          }
          day={
            <Plate
              icon="go"
              iconLast
              rim="right"
              tone="solid"
              onClick={() => tap({ on: "go-ahead" })}
              className="text-k-4"
            >
              {t("start")}
            </Plate>
          }
        />
      </div>
    </KioskFrame>
  );
}
