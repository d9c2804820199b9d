"use client";

import { useTranslations } from "use-intl";
import type { Seen } from "@/components/bench/seen";
import { Icon } from "@/components/ui/icon";
import { Plate } from "@/components/ui/plate";
import type { CountField, Screen } from "@/lib/bench/schema";

type CountState = Extract<Screen, { at: "count" }>;

const fields: readonly CountField[] = ["good", "rework", "scrap"];

/** Good, rework, scrap: each stepped up and down, or keyed by touching its figure. */
export function CountRows({ screen, tap }: Pick<Seen, "tap"> & { screen: CountState }) {
  return (
    <div className="grid content-start gap-2.5">
      {fields.map((field) => (
        <CountRow key={field} field={field} screen={screen} tap={tap} />
      ))}
    </div>
  );
}

function CountRow({
  field,
  screen,
  tap,
}: Pick<Seen, "tap"> & { field: CountField; screen: CountState }) {
  const t = useTranslations("count");
  const what = t(field);
  const count = screen.counts[field];
  const isKeyed = screen.keying?.field === field;
  return (
    <div className="count-row">
      <span className="tag gap-3.5 text-k-3">
        <Icon name={field} />
        {what}
      </span>
      <Plate
        icon="less"
        aria-label={t("fewer", { what })}
        onClick={() => tap({ on: "step", field, by: -1 })}
      >
        {null}
      </Plate>
      <button
        type="button"
        aria-label={t("key", { what, count })}
        aria-pressed={isKeyed}
        onClick={() => tap({ on: "key-count", field })}
        className="count-figure"
      >
        {isKeyed && screen.keying?.digits === "" ? "" : count}
      </button>
      <Plate
        icon="add"
        rim="right"
        aria-label={t("more", { what })}
        onClick={() => tap({ on: "step", field, by: 1 })}
      >
        {null}
      </Plate>
    </div>
  );
}
