"use client";

import { useTranslations } from "use-intl";
import type { SeenBench } from "@/components/bench/seen";
import { Board, Plate } from "@/components/ui/plate";

/** What else the time may run on: tickets on the book's leaf, pauses and other work on the day's. */
export function BenchActs({ view, tap }: SeenBench) {
  const t = useTranslations("bench");
  const isWorking = view.doing?.kind === "work";
  const isBreak = view.doing?.kind === "rest" || view.doing?.kind === "meal";
  return (
    <>
      <Board className="bench-board pr-3.5">
        {isWorking && (
          <Plate icon="scan" rim="left" onClick={() => tap({ on: "scan-for", add: true })}>
            {t("addTicket")}
          </Plate>
        )}
        <Plate
          icon="change"
          {...(isWorking ? {} : { rim: "left" })}
          onClick={() => tap({ on: "scan-for", add: false })}
        >
          {isWorking ? t("changeTicket") : t("scan")}
        </Plate>
      </Board>
      <Board className="bench-board pl-3.5">
        {!isBreak && (
          <Plate icon="rest" onClick={() => tap({ on: "show-break" })}>
            {t("break")}
          </Plate>
        )}
        <Plate icon="other-work" rim="right" onClick={() => tap({ on: "show-other-work" })}>
          {t("otherWork")}
        </Plate>
      </Board>
    </>
  );
}
