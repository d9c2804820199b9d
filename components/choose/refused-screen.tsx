"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot, Leaves } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { itemName, modelName } from "@/components/bench/words";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Icon } from "@/components/ui/icon";
import { Plate } from "@/components/ui/plate";
import { findOperation, mayGoAhead } from "@/lib/bench/offers";
import type { KioskState, Screen } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";

type RefusedState = Extract<Screen, { at: "refused" }>;

/** A kindly no: what is, in one plain sentence, and the ways out of it. */
export function RefusedScreen({ state, tap, screen }: Seen & { screen: RefusedState }) {
  const t = useTranslations("refused");
  const words = useTranslations("common");
  const { why } = screen;
  const facts = refusalFacts(state, screen);
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask className="pt-2 text-k-5" book={facts.operation} day={t(why, facts)} />
        <Leaves
          className="pt-6"
          book={
            <p className="text-right text-k-2">
              <code>{showTicket(screen.ticket)}</code>
              <br />
              {facts.model}
            </p>
          }
          day={
            <p className="flex items-center gap-5 text-k-3 font-semibold">
              <Icon name="loose" className="size-16 flex-none" />
              {t(`${why}How`, facts)}
            </p>
          }
        />
        <Foot
          book={
            <>
              <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
                {words("back")}
              </Plate>
              <Plate icon="lead" onClick={() => tap({ on: "call-lead" })}>
                {t("callLead")}
                <small>{t("callLeadHow")}</small>
              </Plate>
            </>
          }
          day={<WaysOn screen={screen} tap={tap} />}
        />
      </div>
    </KioskFrame>
  );
}

/** Joining is the primary where someone is on it; else another ticket is. */
function WaysOn({ screen, tap }: Pick<Seen, "tap"> & { screen: RefusedState }) {
  const t = useTranslations("refused");
  const { why, choice } = screen;
  const isJoin = why === "someone-on-it";
  const another = (
    <Plate
      icon="change"
      {...(isJoin ? {} : { rim: "right", tone: "solid" })}
      onClick={() => tap({ on: "pick-another" })}
    >
      {t("another")}
    </Plate>
  );
  if (!choice || !mayGoAhead(why)) return another;
  if (isJoin) {
    return (
      <>
        {another}
        <Plate icon="people" rim="right" tone="solid" onClick={() => tap({ on: "go-ahead" })}>
          {t("join")}
        </Plate>
      </>
    );
  }
  return (
    <>
      <Plate icon="go" onClick={() => tap({ on: "go-ahead" })}>
        {t("goAhead")}
        <small>{t("goAheadHow")}</small>
      </Plate>
      {another}
    </>
  );
}

/** The names that the sentences need: operation, model, cell, who is on it, what is open before. */
function refusalFacts(state: KioskState, { ticket, choice }: RefusedState) {
  const known = state.tickets[ticket]?.ticket;
  const operation = choice && findOperation(state, choice);
  const before = known?.operations
    .slice(
      0,
      known.operations.findIndex((each) => each.operation === choice?.operation),
    )
    .find((each) => each.state !== "finished" && each.state !== "closed");
  const other = operation?.workers.find(({ worker }) => worker !== state.visit?.worker);
  return {
    operation: choice ? itemName(state, choice).operation : showTicket(ticket),
    model: known ? modelName(known) : "",
    cell: operation?.cell ?? "",
    name: other?.name ?? "",
    before: before?.name ?? "",
  };
}
