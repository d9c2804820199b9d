"use client";

import type { ReactNode } from "react";
import { useTranslations } from "use-intl";
import { Ask } from "@/components/bench/ask";
import { useClock } from "@/components/bench/seen";
import { itemName, personName, useOtherWork } from "@/components/bench/words";
import type { Deed, ItemKey, KioskState } from "@/lib/bench/schema";

interface Line {
  /** What it was, on the book's leaf. */
  book: ReactNode;
  /** What became of it, on the day's. */
  day: string;
  how: string;
}

/** The card's sentence: the thing on the book's leaf, what became of it on the day's. */
export function DeedWords({ state, deed }: { state: KioskState; deed: Deed }) {
  const t = useTranslations("done");
  const clock = useClock();
  const line = useDeedLine(state, deed);
  const since = clock(state.undo ? state.undo.untilMs - 10_000 : state.nowMs);
  return (
    <div className="grid gap-3" role="status">
      <Ask className="items-baseline text-k-5" book={line.book} day={line.day} />
      <p className="mirror text-k-3 font-medium">
        <span className="pr-[26px] pl-8 text-ink-2">
          {t("kept")}, {t("keptAt", { time: since })}
        </span>
        <span className="pr-8 pl-[26px]">{line.how}</span>
      </p>
    </div>
  );
}

function useDeedLine(state: KioskState, deed: Deed): Line {
  const t = useTranslations("done");
  const bench = useTranslations("bench");
  const otherWork = useOtherWork();
  const clock = useClock();
  const time = clock(state.nowMs);
  switch (deed.what) {
    case "shift-start":
    case "shift-end":
    case "back-to-work":
      return { book: time, day: t(deed.what), how: "" };
    case "undo":
    case "object":
      return { book: "", day: t(deed.what), how: t(`${deed.what}How`) };
    case "work":
    case "add":
    case "run":
      return { book: names(state, deed.items), day: t(deed.what), how: bench("since", { time }) };
    case "reassign": {
      const isOther = deed.items.length === 0;
      const day = isOther ? t("reassignOther") : t("reassign");
      return { book: names(state, deed.items), day, how: t("reassignHow") };
    }
    case "count":
    case "finish": {
      const { counts, open, item } = deed;
      const how = `${t("counts", { ...counts })}, ${t("open", { open })}`;
      return { book: names(state, [item]), day: t(deed.what), how };
    }
    case "put-aside":
      return { book: names(state, [deed.item]), day: t("put-aside"), how: t("put-asideHow") };
    case "break":
      return { book: time, day: t(deed.break), how: t("breakHow", { time }) };
    case "hand-over": {
      const name = personName(state, deed.to) ?? deed.to;
      return {
        book: names(state, [deed.item]),
        day: t("hand-over"),
        how: t("hand-overHow", { name }),
      };
    }
    case "step-done":
    case "step-open":
    case "step-skip":
    case "step-undo":
      return { book: names(state, [deed.item]), day: t("undo"), how: t("undoHow") };
    case "other-work":
      return { book: otherWork(deed.code), day: t("other-work"), how: bench("since", { time }) };
  }
}

/** The ticket operations of a deed: the latest by number and name, how many beside it. */
function names(state: KioskState, items: readonly ItemKey[]): ReactNode {
  const last = items.at(-1);
  if (!last) return "";
  const { number, operation } = itemName(state, last);
  return (
    <>
      <code>{number}</code> {operation}
      {items.length > 1 && ` + ${items.length - 1}`}
    </>
  );
}
