"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import { Pair } from "@/components/bench/pair";
import type { SeenBench } from "@/components/bench/seen";
import { itemName, modelName } from "@/components/bench/words";
import { Pages } from "@/components/choose/pages";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { AcrossPlate, Plate } from "@/components/ui/plate";
import { findOperation, offersOf, onlyWay } from "@/lib/bench/offers";
import type { Choice, KioskState, Screen } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";
import type { TicketOperation } from "@/lib/kiosks/schema";
import { standardMinutes } from "@/lib/seam/verdict";

type OfferState = Extract<Screen, { at: "offer" }>;

const PAGE_SIZE = 7;

/** What a ticket offers here: one plate where there is one way on, a list where there are more. */
export function OfferScreen({ state, view, tap, screen }: SeenBench & { screen: OfferState }) {
  const t = useTranslations("pick");
  const words = useTranslations("common");
  const ticket = state.tickets[screen.ticket]?.ticket;
  const choices = ticket ? offersOf(ticket, { only: onlyWay(screen.purpose, view) }) : [];
  const [only, ...more] = choices;
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[auto_minmax(0,1fr)_auto]">
        <Ask
          className="pt-1 pb-4 text-k-5"
          book={
            only && more.length === 0 ? (
              itemName(state, only).operation
            ) : (
              <code className="text-k-4">{showTicket(screen.ticket)}</code>
            )
          }
          day={more.length > 0 ? t("offer") : t("offerOne")}
        />
        {only && more.length === 0 ? (
          <OneOffer state={state} choice={only} tap={tap} />
        ) : (
          <Pages
            size={PAGE_SIZE}
            page={screen.page}
            onPage={(page) => tap({ on: "page", page })}
            plates={choices.map((choice) => (
              <Plate
                key={`${choice.operation} ${choice.activity}`}
                icon={choice.activity === "inspect" ? "find" : choice.activity}
                onClick={() => tap({ on: "take", choice })}
              >
                <OfferWords state={state} choice={choice} />
              </Plate>
            ))}
          />
        )}
        <Foot
          book={
            <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
              {words("back")}
            </Plate>
          }
          day={
            <p className="self-center text-k-2 font-semibold">
              <code>{showTicket(screen.ticket)}</code> {ticket && modelName(ticket)}
              <span className="block text-k-1 font-medium text-ink-2">
                {ticket &&
                  (ticket.quantity > 1
                    ? words("lot", { quantity: ticket.quantity })
                    : words("one"))}
              </span>
            </p>
          }
        />
      </div>
    </KioskFrame>
  );
}

/** One way on: what it should take against what it took so far, and one tap across the seam. */
function OneOffer({ state, choice, tap }: Pick<SeenBench, "state" | "tap"> & { choice: Choice }) {
  const t = useTranslations("pick");
  const bench = useTranslations("bench");
  const operation = findOperation(state, choice);
  return (
    <div className="grid content-evenly">
      {operation && (
        <Pair
          pair={pairOf(operation)}
          standard={operation.quantity > 1 ? bench("standardLot") : bench("standardOne")}
          actual={bench("actual")}
        />
      )}
      <div className="grid px-8 portrait:px-6">
        <AcrossPlate
          icon={choice.activity === "inspect" ? "find" : choice.activity}
          then={<OfferOthers state={state} choice={choice} />}
          onClick={() => tap({ on: "take", choice })}
          className="min-h-[148px]"
        >
          {t(choice.activity)}
        </AcrossPlate>
      </div>
    </div>
  );
}

/** All of an operation: setup and every piece that is or will be good, against all time booked. */
function pairOf({ setupSeconds, runSeconds, good, openQuantity, actualSeconds }: TicketOperation) {
  const standardSeconds =
    runSeconds === null ? null : (setupSeconds ?? 0) + runSeconds * (good + openQuantity);
  return { standardSeconds, actualSeconds };
}

function OfferWords({ state, choice }: { state: KioskState; choice: Choice }) {
  const t = useTranslations("pick");
  return (
    <>
      {t(choice.activity)}: {itemName(state, choice).operation}
      <small>
        <OfferTime state={state} choice={choice} /> <OfferOthers state={state} choice={choice} />
      </small>
    </>
  );
}

/** The standard of what is offered: of the setup, or of the pieces still open. */
function OfferTime({ state, choice }: { state: KioskState; choice: Choice }) {
  const t = useTranslations("pick");
  const operation = findOperation(state, choice);
  if (!operation) return null;
  const { setupSeconds, runSeconds, openQuantity, rework } = operation;
  if (choice.activity === "rework") return t("reworkOpen", { count: rework });
  if (choice.activity === "setup") {
    return t("setupTime", { minutes: standardMinutes(setupSeconds ?? 0) });
  }
  if (runSeconds === null) return t("noTime");
  return t("runTime", { minutes: standardMinutes(runSeconds * openQuantity) });
}

/** Who else is on it now. */
function OfferOthers({ state, choice }: { state: KioskState; choice: Choice }) {
  const t = useTranslations("pick");
  const others = (findOperation(state, choice)?.workers ?? []).filter(
    ({ worker }) => worker !== state.visit?.worker,
  );
  const [first, ...more] = others;
  if (!first) return null;
  return more.length > 0
    ? t("withMore", { name: first.name, count: more.length })
    : t("with", { name: first.name });
}
