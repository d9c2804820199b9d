"use client";

import { useTranslations } from "use-intl";
import { Ask } from "@/components/bench/ask";
import { BenchActs } from "@/components/bench/bench-acts";
import { BenchFoot } from "@/components/bench/bench-foot";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { modelName, useSeamWords } from "@/components/bench/words";
import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { AcrossPlate } from "@/components/ui/plate";
import type { ItemView } from "@/lib/bench/item-view";
import { findOperation } from "@/lib/bench/offers";
import { showTicket } from "@/lib/codes/ticket-code";
import { seamScale } from "@/lib/seam/scale";
import { actualMinutes, standardMinutes } from "@/lib/seam/verdict";

/** One ticket on the bench: its standard and its actual meet at the seam, and the actual grows. */
export function BenchWork({ item, ...seen }: SeenBench & { item: ItemView }) {
  const words = useSeamWords();
  const { standardSeconds, actualSeconds } = item;
  const scaleSeconds = seamScale([{ standardSeconds, actualSeconds }]);
  return (
    <div className="bench">
      <Job {...seen} item={item} />
      <Figures item={item} />
      <SeamGauge
        flush
        size="bench"
        state="live"
        words={words}
        rework={seen.view.activity === "rework"}
        name={item.name}
        standardSeconds={standardSeconds}
        actualSeconds={actualSeconds}
        scaleSeconds={scaleSeconds}
        className="portrait:[--h:152px]"
      />
      <SeamAxis unitShown scaleSeconds={scaleSeconds} className="text-k-1 text-ink-2" />
      <div className="bench-acts">
        <BenchActs {...seen} />
        <DoneBar {...seen} />
      </div>
      <BenchFoot {...seen} />
    </div>
  );
}

/** What is worked on, and how far it is. */
function Job({ view, item }: SeenBench & { item: ItemView }) {
  const t = useTranslations("bench");
  const clock = useClock();
  const time = clock((view.since ?? 0) * 1000);
  const activity =
    view.activity === "setup" ? t("setup") : view.activity === "rework" ? t("rework") : null;
  const isLot = item.quantity > 1;
  return (
    <section className="mirror text-k-2 portrait:text-k-1">
      <p className="truncate pr-8 pl-8 portrait:px-6">
        {activity && <b className="text-standard-ink">{activity}, </b>}
        <code>{showTicket(item.ticket)}</code>&ensp;{modelName(item)}
      </p>
      <p className="truncate pr-8 pl-8 portrait:px-6">
        {isLot ? t("lot", { quantity: item.quantity, time }) : t("one", { time })}
      </p>
      <Ask
        className="col-span-2 mt-0.5 text-k-4 portrait:text-[32px]"
        book={
          <span className="block pl-2 [text-wrap:balance] landscape:truncate">{item.name}</span>
        }
        day={
          <span className="font-medium">
            {isLot
              ? t("progress", { good: item.good, open: item.open })
              : t("toGo", { open: item.open })}
          </span>
        }
      />
    </section>
  );
}

/** The two key figures, hugging the seam. */
function Figures({ item }: { item: ItemView }) {
  const t = useTranslations("bench");
  const { standardSeconds, actualSeconds, quantity } = item;
  const label = quantity > 1 ? t("standardLot") : t("standardOne");
  return (
    <section className="hug bench-hug">
      <div>
        {standardSeconds === null ? (
          <span className="text-k-4 text-standard-ink">{t("noStandard")}</span>
        ) : (
          <>
            <span className="max-w-[170px] text-standard-ink portrait:max-w-none">{label}</span>
            <b>{standardMinutes(standardSeconds)}</b>
          </>
        )}
      </div>
      <div>
        <b className="text-actual">{actualMinutes(actualSeconds)}</b>
        <span className="max-w-[110px] text-actual portrait:max-w-none">{t("actual")}</span>
      </div>
    </section>
  );
}

/** The act that closes the work; while setting up it opens the run, in a cell the sheet. */
export function DoneBar({ state, view, tap }: SeenBench) {
  const t = useTranslations("bench");
  const sheet = useTranslations("sheet");
  if (view.activity === "setup") {
    return (
      <AcrossPlate icon="run" then={t("setupThen")} onClick={() => tap({ on: "run" })}>
        {t("setupDone")}
      </AcrossPlate>
    );
  }
  const stepped = view.items.some((item) => findOperation(state, item)?.sheet);
  if (stepped) {
    return (
      <AcrossPlate
        icon="ticket"
        then={sheet("openThen")}
        onClick={() => tap({ on: "show-sheet", item: null })}
      >
        {sheet("open")}
      </AcrossPlate>
    );
  }
  const then = view.items.length > 1 ? t("doneWhich") : t("doneThen");
  return (
    <AcrossPlate icon="good" then={then} onClick={() => tap({ on: "count" })}>
      {t("done")}
    </AcrossPlate>
  );
}
