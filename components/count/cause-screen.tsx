"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { itemName } from "@/components/bench/words";
import { Pages } from "@/components/choose/pages";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import type { KioskState, Screen } from "@/lib/bench/schema";

type CauseState = Extract<Screen, { at: "cause" }>;

const PAGE_SIZE = 7;

/** Which operation caused the rework or scrap: this one, or one before it, the nearest first. */
export function CauseScreen({ state, tap, screen }: Seen & { screen: CauseState }) {
  const t = useTranslations("cause");
  const words = useTranslations("common");
  const { counts, item } = screen;
  const bad = [
    counts.rework > 0 && t("rework", { count: counts.rework }),
    counts.scrap > 0 && t("scrap", { count: counts.scrap }),
  ];
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask book={bad.filter(Boolean).join(", ")} day={t("ask")} />
        <Pages
          size={PAGE_SIZE}
          page={screen.page}
          onPage={(page) => tap({ on: "page", page })}
          plates={causes(state, screen).map(({ operation, name }) => (
            <Plate key={operation} onClick={() => tap({ on: "cause", operation })}>
              {name}
              {operation === item.operation && <small>{t("here")}</small>}
            </Plate>
          ))}
        />
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

/** This operation first, then those before it, the last one first. */
function causes(state: KioskState, { item }: CauseState): { operation: string; name: string }[] {
  const known = state.tickets[item.ticket]?.ticket.operations ?? [];
  const here = known.findIndex(({ operation }) => operation === item.operation);
  if (here < 0) return [{ operation: item.operation, name: itemName(state, item).operation }];
  return known.slice(0, here + 1).toReversed();
}
