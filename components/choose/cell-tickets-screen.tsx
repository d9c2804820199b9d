"use client";

import { useLocale, useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { modelName } from "@/components/bench/words";
import { Pages } from "@/components/choose/pages";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Plate } from "@/components/ui/plate";
import type { KioskState, Screen } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";
import { dayText } from "@/lib/time/format";

/** Four rows of two leaves; the place of the last is the page-turner's where there are more. */
const PAGE_SIZE = 7;

/** The cell's open tickets in due order, for whoever has none at hand. */
export function CellTicketsScreen({
  state,
  tap,
  screen,
}: Seen & { screen: Extract<Screen, { at: "cell-tickets" }> }) {
  const t = useTranslations("pick");
  const words = useTranslations("common");
  const cell = state.cell?.cells[0] ?? state.device?.cell ?? "";
  const queue = state.cell?.queue ?? [];
  const isEmpty = queue.length === 0;
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[84px_minmax(0,1fr)_auto]">
        <Ask
          book={isEmpty ? t("none") : t("tickets", { cell })}
          day={<span className="font-medium">{isEmpty ? t("noneHow") : t("ticketsHow")}</span>}
        />
        <Pages
          size={PAGE_SIZE}
          page={screen.page}
          onPage={(page) => tap({ on: "page", page })}
          plates={queue.map((key) => (
            <Plate
              key={`${key.ticket} ${key.operation}`}
              onClick={() => tap({ on: "take-ticket", ticket: key.ticket })}
            >
              <QueueWords state={state} entry={key} />
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

function QueueWords({
  state,
  entry,
}: {
  state: KioskState;
  entry: { ticket: string; operation: string };
}) {
  const t = useTranslations("pick");
  const language = useLocale();
  const ticket = state.tickets[entry.ticket]?.ticket;
  const operation = ticket?.operations.find((each) => each.operation === entry.operation);
  const due = ticket?.dueOn ? t("due", { date: dayText(ticket.dueOn, language) }) : "";
  return (
    <>
      <code>{showTicket(entry.ticket)}</code> {operation?.name ?? entry.operation}
      <small>{[ticket ? modelName(ticket) : "", due].filter(Boolean).join(", ")}</small>
    </>
  );
}
