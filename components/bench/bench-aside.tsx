"use client";

import { useTranslations } from "use-intl";
import { Ask, Leaves } from "@/components/bench/ask";
import { BenchActs } from "@/components/bench/bench-acts";
import { BenchFoot } from "@/components/bench/bench-foot";
import { BigMinutes } from "@/components/bench/big-minutes";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { itemName, useOtherWork } from "@/components/bench/words";
import { AcrossPlate } from "@/components/ui/plate";
import type { ItemKey, KioskState } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";
import type { Doing } from "@/lib/timeline/schema";

type Aside = Extract<Doing, { kind: "meal" | "rest" | "indirect" }>;

/** On a break or on other work: how long, and the way back. */
export function BenchAside({ doing, ...seen }: SeenBench & { doing: Aside }) {
  const { state, view } = seen;
  const t = useTranslations("bench");
  const clock = useClock();
  const otherWork = useOtherWork();
  const since = view.since ?? Math.floor(state.nowMs / 1000);
  const title = {
    meal: t("mealTitle"),
    rest: t("restTitle"),
    indirect: doing.kind === "indirect" ? otherWork(doing.code) : "",
  }[doing.kind];
  const then = resumedName(state, view.items, view.resumes, otherWork);
  return (
    <div className="bench bench-many">
      <Ask
        className="pt-2 text-k-5"
        book={title}
        day={<span className="font-medium">{t("since", { time: clock(since * 1000) })}</span>}
      />
      <Leaves
        className="content-center"
        book={
          <p className="text-right text-k-3 font-semibold">
            {doing.kind === "indirect" ? t("otherTitle") : then && t("resumes", { what: then })}
          </p>
        }
        day={<BigMinutes seconds={Math.max(0, Math.floor(state.nowMs / 1000) - since)} />}
      />
      <div className="bench-acts">
        <BenchActs {...seen} />
        <BackBar {...seen} doing={doing} then={then} />
      </div>
      <BenchFoot {...seen} />
    </div>
  );
}

/** The way back: out of the break, back to the ticket, or on to a new one. */
function BackBar({ view, tap, doing, then, state }: SeenBench & { doing: Aside; then: string }) {
  const t = useTranslations("bench");
  const [previous] = view.previous?.items ?? [];
  if (doing.kind !== "indirect") {
    return (
      <AcrossPlate
        icon="back"
        then={then ? t("backTo", { what: then }) : t("backToNothing")}
        onClick={() => tap({ on: "end-break" })}
      >
        {t("back")}
      </AcrossPlate>
    );
  }
  if (previous) {
    return (
      <AcrossPlate
        icon="back"
        then={itemName(state, previous).operation}
        onClick={() => tap({ on: "resume" })}
      >
        {t("resume", { ticket: showTicket(previous.ticket) })}
      </AcrossPlate>
    );
  }
  return (
    <AcrossPlate
      icon="scan"
      then={t("scanThen")}
      onClick={() => tap({ on: "scan-for", add: false })}
    >
      {t("scan")}
    </AcrossPlate>
  );
}

/** What a break interrupted, in a few words; empty where it was nothing. */
function resumedName(
  state: KioskState,
  items: readonly ItemKey[],
  resumes: Doing | null,
  otherWork: (code: string) => string,
): string {
  if (resumes?.kind === "indirect") return otherWork(resumes.code);
  const [item, ...more] = items;
  if (!item) return "";
  const { number, operation } = itemName(state, item);
  return more.length > 0 ? `${number} + ${more.length}` : `${number} ${operation}`;
}
