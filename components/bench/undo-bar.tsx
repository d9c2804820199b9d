"use client";

import { useTranslations } from "use-intl";
import type { Seen } from "@/components/bench/seen";
import { Icon } from "@/components/ui/icon";

/** The last act may be taken back: a bar across the seam that runs out in ten seconds. */
export function UndoBar({ state, tap, className = "" }: Seen & { className?: string }) {
  const t = useTranslations("done");
  const { undo } = state;
  if (!undo) return null;
  const seconds = Math.max(1, Math.ceil((undo.untilMs - state.nowMs) / 1000));
  return (
    <button
      type="button"
      onClick={() => tap({ on: "undo" })}
      className={`plate undo-bar ${className}`}
      data-rim="both"
      data-minor=""
    >
      <i aria-hidden key={undo.event} />
      <span>
        <Icon name="undo" />
        {t("undoIt")}
      </span>
      <span>{t("undoWhat", { seconds })}</span>
    </button>
  );
}
