"use client";

import type { ReactNode } from "react";
import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { SeenBench } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { CountRows } from "@/components/count/count-rows";
import { CountGauge } from "@/components/seam/count-gauge";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Icon } from "@/components/ui/icon";
import { Keypad } from "@/components/ui/keypad";
import { Plate } from "@/components/ui/plate";
import type { Screen } from "@/lib/bench/schema";
import { actualMinutes, standardMinutes } from "@/lib/seam/verdict";
import { isSameItem } from "@/lib/taps/moves";

type CountState = Extract<Screen, { at: "count" }>;

/** How did they come out? The ticket on one side of the seam, the count on the other. */
export function CountScreen({ state, view, tap, screen }: SeenBench & { screen: CountState }) {
  const t = useTranslations("count");
  const { counts, open, keying } = screen;
  const counted = counts.good + counts.rework + counts.scrap;
  return (
    <KioskFrame state={state}>
      <div
        className={`grid min-h-0 ${keying ? "landscape:grid-rows-[68px_48px_minmax(0,1fr)_auto]" : ""} grid-rows-[84px_112px_minmax(0,1fr)_auto]`}
      >
        <Ask
          className="text-[42px] portrait:text-k-4"
          book={t("says", { open })}
          day={open === 1 ? t("askOne") : t("ask")}
        />
        <CountGauge
          flush
          ticket={open}
          count={counts}
          label={t("counted", { counted, open })}
          className={keying ? "[--h:112px] landscape:[--h:48px]" : "[--h:112px]"}
        />
        <Leaves
          className={keying ? "pt-5 landscape:pt-2.5" : "pt-5"}
          book={
            keying ? (
              <CountPad keying={keying} tap={tap} />
            ) : (
              <Facts state={state} view={view} tap={tap} screen={screen} />
            )
          }
          day={<CountRows screen={screen} tap={tap} />}
        />
        <Foot
          book={
            <>
              <CountBack tap={tap} />
              <p className="flex items-center justify-end gap-3 self-center text-right text-k-3 font-semibold">
                <Icon
                  name={counted === open ? "on-standard" : "under"}
                  className="size-9 flex-none"
                />
                {t("counted", { counted, open })}
              </p>
            </>
          }
          day={<CountEnds screen={screen} tap={tap} />}
        />
      </div>
    </KioskFrame>
  );
}

function CountBack({ tap }: Pick<SeenBench, "tap">) {
  const words = useTranslations("common");
  return (
    <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
      {words("back")}
    </Plate>
  );
}

/** What is counted: the ticket, its operation, and the time on it. */
function Facts({ state, view, screen }: SeenBench & { screen: CountState }) {
  const t = useTranslations("count");
  const name = itemName(state, screen.item);
  const item = view.items.find((each) => isSameItem(each, screen.item));
  const actual = actualMinutes(item?.actualSeconds ?? 0);
  const standard = item?.standardSeconds ?? null;
  return (
    <dl className="grid gap-2.5 text-right">
      <Fact term={t("ticket")}>
        <code>{name.number}</code> {name.model}
      </Fact>
      <Fact term={t("operation")}>{name.operation}</Fact>
      <Fact term={t("time")}>
        {standard === null
          ? t("timeOnly", { actual })
          : t("timeOf", { actual, standard: standardMinutes(standard) })}
      </Fact>
    </dl>
  );
}

function Fact({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-k-1 text-ink-2">{term}</dt>
      <dd className="text-k-3 font-semibold leading-tight">{children}</dd>
    </div>
  );
}

function CountPad({
  keying,
  tap,
}: Pick<SeenBench, "tap"> & { keying: NonNullable<CountState["keying"]> }) {
  const t = useTranslations("count");
  const words = useTranslations("common");
  return (
    <Keypad
      onDigit={(digit) => tap({ on: "digit", digit })}
      onRubOut={() => tap({ on: "rub-out" })}
      onOk={() => tap({ on: "submit" })}
      okLabel={t("set")}
      rubOutLabel={words("rubOut")}
      className="count-pad"
      rim="both"
      key={keying.field}
    />
  );
}

/** Counting lets the work run on, or closes it; what is not good asks why first. */
function CountEnds({ screen, tap }: Pick<SeenBench, "tap"> & { screen: CountState }) {
  const t = useTranslations("count");
  const { counts, open } = screen;
  const bad = counts.rework + counts.scrap;
  const counted = counts.good + bad;
  if (counted === 0) {
    return (
      <Plate
        icon="pause"
        rim="right"
        tone="solid"
        onClick={() => tap({ on: "counted", stop: true })}
      >
        {t("putAside")}
        <small>{t("putAsideHow")}</small>
      </Plate>
    );
  }
  return (
    <>
      {counts.good + counts.scrap < open && (
        <Plate icon="run" onClick={() => tap({ on: "counted", stop: false })}>
          {t("workOn")}
        </Plate>
      )}
      <Plate
        icon={bad > 0 ? "go" : "good"}
        iconLast
        rim="right"
        tone="solid"
        onClick={() => tap({ on: "counted", stop: true })}
        className="text-k-3"
      >
        {bad > 0 ? t("sayWhy", { count: bad }) : t("done")}
      </Plate>
    </>
  );
}
