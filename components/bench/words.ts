import { useTranslations } from "use-intl";
import type { ItemKey, KioskState } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";
import { otherWorkCodes } from "@/lib/ledger/other-work";
import type { en } from "@/lib/messages/en";
import type { SeamWords } from "@/lib/seam/words";

declare module "use-intl" {
  interface AppConfig {
    Messages: typeof en;
  }
}

/** The seam gauge's words in the language of the screen. */
export function useSeamWords(): SeamWords {
  const t = useTranslations("seam");
  return {
    onStandard: t("onStandard"),
    noStandard: t("noStandard"),
    held: t("held"),
    paused: t("paused"),
    rework: t("rework"),
    otherWork: t("otherWork"),
    over: (minutes) => t("over", { minutes }),
    left: (minutes) => t("left", { minutes }),
    under: (minutes) => t("under", { minutes }),
    standard: (minutes) => t("standard", { minutes }),
    actual: (minutes) => t("actual", { minutes }),
  };
}

/** What a ticket operation is called here, as far as this tablet knows it. */
export interface ItemName {
  /** The number as people read it. */
  number: string;
  /** Model and options, "Heron, natural satin"; empty where it is not known. */
  model: string;
  /** The operation's name, else its code. */
  operation: string;
}

/** Names a ticket operation from what this tablet knows: the benches, the cell, what was looked up. */
export function itemName(state: KioskState, { ticket, operation }: ItemKey): ItemName {
  const known = state.tickets[ticket]?.ticket;
  const lies = Object.values(state.benches)
    .flatMap(({ work }) => work?.items ?? [])
    .find((item) => item.ticket === ticket && item.operation === operation);
  const named = known?.operations.find((each) => each.operation === operation);
  return {
    number: showTicket(ticket),
    model: modelName(known ?? lies ?? { model: "", options: [] }),
    operation: named?.name ?? lies?.name ?? operation,
  };
}

/** The name behind a number where this tablet knows it; it tells nobody whether a number exists. */
export function personName({ sessions, cell }: KioskState, worker: string): string | undefined {
  return sessions[worker]?.name ?? cell?.people.find((each) => each.worker === worker)?.name;
}

/** Model and options as one line. */
export function modelName(named: { model: string; options: readonly string[] }): string {
  return [named.model, ...named.options].filter(Boolean).join(", ");
}

/** Names other work by its code; a code that the kiosk has no word for is shown as it is. */
export function useOtherWork(): (code: string) => string {
  const t = useTranslations("other");
  return (code) => {
    const known = otherWorkCodes.find((each) => each === code);
    return known ? t(known) : code;
  };
}
