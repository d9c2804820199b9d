"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Icon } from "@/components/ui/icon";
import { Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";

/** Scrap asks first: it is the one count that nobody works on again. */
export function ScrapScreen({
  state,
  tap,
  screen,
}: Seen & { screen: Extract<Screen, { at: "scrap" }> }) {
  const t = useTranslations("scrap");
  const words = useTranslations("common");
  const name = itemName(state, screen.item);
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask
          className="pt-4 text-k-5"
          book={name.operation}
          day={<span className="text-danger">{t("title", { count: screen.counts.scrap })}</span>}
        />
        <Leaves
          className="pt-6"
          book={
            <p className="text-right text-k-3 font-semibold">
              <code>{name.number}</code>
              <br />
              {name.model}
            </p>
          }
          day={
            <p className="flex items-center gap-5 text-k-3 font-semibold">
              <Icon name="scrap" className="size-16 flex-none text-danger" />
              {t("how")}
            </p>
          }
        />
        <Foot
          book={
            <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
              {words("back")}
            </Plate>
          }
          day={
            <Plate icon="scrap" rim="right" tone="danger" onClick={() => tap({ on: "go-ahead" })}>
              {t("yes")}
            </Plate>
          }
        />
      </div>
    </KioskFrame>
  );
}
