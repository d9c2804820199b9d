"use client";

import { useTranslations } from "use-intl";
import { Ask } from "@/components/bench/ask";
import { BenchActs } from "@/components/bench/bench-acts";
import { BenchFoot } from "@/components/bench/bench-foot";
import { DoneBar } from "@/components/bench/bench-work";
import type { SeenBench } from "@/components/bench/seen";
import { useSeamWords } from "@/components/bench/words";
import { SeamGauge } from "@/components/seam/gauge";
import type { ItemView } from "@/lib/bench/item-view";
import { showTicket } from "@/lib/codes/ticket-code";
import { seamScale } from "@/lib/seam/scale";
import { actualMinutes, standardMinutes } from "@/lib/seam/verdict";

/** As many gauges as one reads at a glance; a carrier with more says how many are left out. */
const SHOWN = 3;

/** Several tickets at once: one scale, one gauge each, and how the time is shared among them. */
export function BenchSeveral(seen: SeenBench) {
  const t = useTranslations("bench");
  const { items } = seen.view;
  const scaleSeconds = seamScale(items);
  const shown = items.slice(0, items.length > SHOWN ? SHOWN - 1 : SHOWN);
  const left = items.length - shown.length;
  return (
    <div className="bench bench-many">
      <Ask
        className="text-k-4"
        book={t("several", { count: items.length })}
        day={<span className="font-medium">{t("shared")}</span>}
      />
      <ul className="grid content-evenly">
        {shown.map((item) => (
          <ItemRow
            key={`${item.ticket} ${item.operation}`}
            item={item}
            scaleSeconds={scaleSeconds}
          />
        ))}
        {left > 0 && (
          <li className="mirror text-k-2 font-bold">
            <span />
            <span className="pl-[26px]">+ {left}</span>
          </li>
        )}
      </ul>
      <div className="bench-acts">
        <BenchActs {...seen} />
        <DoneBar {...seen} />
      </div>
      <BenchFoot {...seen} />
    </div>
  );
}

function ItemRow({ item, scaleSeconds }: { item: ItemView; scaleSeconds: number }) {
  const t = useTranslations("bench");
  const words = useSeamWords();
  const { standardSeconds, actualSeconds } = item;
  const actual = actualMinutes(actualSeconds);
  return (
    <li className="grid gap-1">
      <p className="mirror items-end text-k-2">
        <span className="pr-[26px] pl-8 portrait:pl-6 landscape:truncate">
          <code>{showTicket(item.ticket)}</code> <b>{item.name}</b>
        </span>
        <span className="pr-8 pl-[26px] portrait:pr-6">
          <b className="text-actual">
            {standardSeconds === null
              ? t("actualOnly", { actual })
              : t("actualOf", { actual, standard: standardMinutes(standardSeconds) })}
          </b>
          <span className="text-ink-2 portrait:block">
            <span className="portrait:hidden">, </span>
            {t("share", { percent: Math.round(item.share * 100) })}
          </span>
        </span>
      </p>
      <SeamGauge
        flush
        size="phone"
        state="live"
        words={words}
        name={item.name}
        standardSeconds={standardSeconds}
        actualSeconds={actualSeconds}
        scaleSeconds={scaleSeconds}
      />
    </li>
  );
}
