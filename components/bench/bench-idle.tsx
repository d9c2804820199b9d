"use client";

import { useTranslations } from "use-intl";
import { Ask, Leaves } from "@/components/bench/ask";
import { BenchFoot } from "@/components/bench/bench-foot";
import { BigMinutes } from "@/components/bench/big-minutes";
import { type SeenBench, useClock } from "@/components/bench/seen";
import { itemName, modelName } from "@/components/bench/words";
import { AcrossPlate, Board, Plate } from "@/components/ui/plate";
import { showTicket } from "@/lib/codes/ticket-code";
import { sheetsToGoOn } from "@/lib/sheet/on-bench";
import { tappedOff } from "@/lib/sheet/order";

/** As many as fit above the primary act without scrolling. */
const NEXT_SHOWN = 3;

/** In the shift and on nothing: what is next? */
export function BenchIdle(seen: SeenBench) {
  const { state, view, tap } = seen;
  const t = useTranslations("bench");
  const clock = useClock();
  const since = view.since ?? Math.floor(state.nowMs / 1000);
  return (
    <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto_auto]">
      <Ask className="py-1 text-k-5" book={t("next")} day={t("unassigned")} />
      <Leaves
        className="pt-2"
        book={<NextTickets {...seen} />}
        day={
          <div className="grid h-full content-between gap-3">
            <BigMinutes
              seconds={Math.max(0, Math.floor(state.nowMs / 1000) - since)}
              label={t("since", { time: clock(since * 1000) })}
            />
            <Board className="bench-board">
              <Plate icon="rest" onClick={() => tap({ on: "show-break" })}>
                {t("break")}
              </Plate>
              <Plate icon="other-work" rim="right" onClick={() => tap({ on: "show-other-work" })}>
                {t("otherWork")}
              </Plate>
            </Board>
          </div>
        }
      />
      <div className="grid px-8 pt-3 portrait:px-6">
        <AcrossPlate
          icon="scan"
          then={t("scanThen")}
          onClick={() => tap({ on: "scan-for", add: false })}
        >
          {t("scan")}
        </AcrossPlate>
      </div>
      <BenchFoot {...seen} />
    </div>
  );
}

/** What one could go back to, and the tickets that this cell could take next. */
function NextTickets({ state, view, tap }: SeenBench) {
  const t = useTranslations("bench");
  const stop = useTranslations("stop");
  const cell = state.cell?.cells[0] ?? state.device?.cell ?? "";
  const [back] = view.previous?.items ?? [];
  const begun = sheetsToGoOn(state, state.visit?.worker ?? "", view)
    .filter((one) => one.ticket !== back?.ticket)
    .slice(0, back ? NEXT_SHOWN - 1 : NEXT_SHOWN);
  const shown = view.next.slice(0, NEXT_SHOWN - begun.length - (back ? 1 : 0));
  if (!back && begun.length + shown.length === 0) {
    return <p className="text-right text-k-3 font-semibold">{t("nothingNext", { cell })}</p>;
  }
  return (
    <Board stacked className="next-tickets">
      {back && (
        <Plate icon="back" onClick={() => tap({ on: "resume" })}>
          {t("resume", { ticket: showTicket(back.ticket) })}
          <small className="truncate">{itemName(state, back).operation}</small>
        </Plate>
      )}
      {begun.map((one) => (
        <Plate
          key={`${one.ticket} ${one.operation}`}
          icon="go"
          iconLast
          onClick={() => tap({ on: "go-on", item: one })}
        >
          <code>{showTicket(one.ticket)}</code> {modelName(one)}
          <small className="truncate">{stop("tapped", tappedOff(one.sheet))}</small>
        </Plate>
      ))}
      {shown.map((next) => (
        <Plate
          key={`${next.ticket} ${next.operation}`}
          icon="go"
          iconLast
          onClick={() => tap({ on: "take-ticket", ticket: next.ticket })}
        >
          <code>{showTicket(next.ticket)}</code> {next.name}
          <small className="truncate">{modelName(next)}</small>
        </Plate>
      ))}
    </Board>
  );
}
