"use client";

import type { ReactNode } from "react";
import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Board, Plate } from "@/components/ui/plate";

/** Asks for a word why, on four plates: two a leaf. */
export function WhyScreen<Reason extends string>({
  state,
  tap,
  what,
  ask,
  reasons,
  wordOf,
  onReason,
}: Seen & {
  what: ReactNode;
  ask: string;
  reasons: readonly Reason[];
  wordOf: (reason: Reason) => string;
  onReason: (reason: Reason) => void;
}) {
  const words = useTranslations("common");
  const half = Math.ceil(reasons.length / 2);
  const leaf = (from: number, to: number) => (
    <Board stacked className="pages-leaf stop-board" data-side={from === 0 ? "book" : "day"}>
      {reasons.slice(from, to).map((reason) => (
        <Plate key={reason} onClick={() => onReason(reason)}>
          {wordOf(reason)}
        </Plate>
      ))}
    </Board>
  );
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask
          className="pt-4 text-k-4"
          book={ask}
          day={<span className="font-medium">{what}</span>}
        />
        <Leaves className="content-center" book={leaf(0, half)} day={leaf(half, reasons.length)} />
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
