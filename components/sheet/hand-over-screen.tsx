"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { Seen, SeenBench } from "@/components/bench/seen";
import { itemName, personName } from "@/components/bench/words";
import { Pages } from "@/components/choose/pages";
import { WhyScreen } from "@/components/sheet/why-screen";
import { useHandOverReason } from "@/components/sheet/words";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import { findOperation } from "@/lib/bench/offers";
import type { Screen } from "@/lib/bench/schema";
import { handOverReasons } from "@/lib/sheet/reasons";

/** Four rows of two leaves; the last place is the page-turner's. */
const PAGE_SIZE = 7;

type HandOver = Extract<Screen, { at: "hand-over" }>;

/** Who goes on with it, and then why. */
export function HandOverScreen({ screen, ...seen }: SeenBench & { screen: HandOver }) {
  const t = useTranslations("handOver");
  const reason = useHandOverReason();
  const { state, tap } = seen;
  if (screen.to === null) return <WhoScreen {...seen} screen={screen} />;
  return (
    <WhyScreen
      {...seen}
      ask={t("why")}
      what={t("to", { name: personName(state, screen.to) ?? screen.to })}
      reasons={handOverReasons}
      wordOf={reason}
      onReason={(each) => tap({ on: "hand-because", reason: each })}
    />
  );
}

function WhoScreen({ state, tap, screen }: Seen & { screen: HandOver }) {
  const t = useTranslations("handOver");
  const words = useTranslations("common");
  const people = (state.cell?.people ?? [])
    .filter(({ worker }) => worker !== state.visit?.worker)
    .sort((a, b) => Number(b.inSince !== null) - Number(a.inSince !== null));
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask book={t("who")} day={<span className="font-medium">{t("whoHow")}</span>} />
        <Pages
          size={PAGE_SIZE}
          page={screen.page}
          onPage={(page) => tap({ on: "page", page })}
          plates={people.map(({ worker, name, inSince }) => (
            <Plate key={worker} onClick={() => tap({ on: "hand-to", to: worker })}>
              {name}
              <small>
                <code>{worker}</code> {inSince === null ? t("out") : t("in")}
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
        />
      </div>
    </KioskFrame>
  );
}

/** The colleague is asked: take it now, or not now. */
export function HandedScreen({
  state,
  tap,
  screen,
}: SeenBench & { screen: Extract<Screen, { at: "handed" }> }) {
  const t = useTranslations("handOver");
  const reasonOf = useHandOverReason();
  const { number, model, operation } = itemName(state, screen.item);
  const handOver = findOperation(state, screen.item)?.sheet?.handOver;
  const from = handOver?.from ?? "";
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask
          className="pt-4 text-k-5"
          book={t("gives", { name: personName(state, from) ?? from })}
          day={reasonOf(handOver?.reason ?? null)}
        />
        <Leaves
          className="content-center text-k-3 font-semibold"
          book={
            <p className="text-right">
              <code>{number}</code> {model}
            </p>
          }
          day={<p>{operation}</p>}
        />
        <Foot
          book={
            <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
              {t("notNow")}
            </Plate>
          }
          day={
            <Plate
              icon="go"
              iconLast
              rim="right"
              tone="solid"
              onClick={() => tap({ on: "go-ahead" })}
            >
              {t("take")}
            </Plate>
          }
        />
      </div>
    </KioskFrame>
  );
}
