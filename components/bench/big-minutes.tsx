"use client";

import { useTranslations } from "use-intl";

/** A key figure that hugs the seam from the day's side: whole minutes. */
export function BigMinutes({ seconds, label }: { seconds: number; label?: string }) {
  const t = useTranslations("bench");
  return (
    <p className="flex items-baseline gap-4 text-indirect">
      <b className="text-k-7 font-bold leading-[0.86] tracking-[-0.03em]">
        {Math.floor(seconds / 60)}
      </b>
      <span className="text-k-2 font-semibold leading-tight">
        {t("minutes")}
        {label && <span className="block">{label}</span>}
      </span>
    </p>
  );
}
