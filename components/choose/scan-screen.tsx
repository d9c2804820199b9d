"use client";

import { useTranslations } from "use-intl";
import { Ask, Foot } from "@/components/bench/ask";
import type { Seen } from "@/components/bench/seen";
import { modelName } from "@/components/bench/words";
import { Camera } from "@/components/choose/camera";
import { KioskFrame } from "@/components/shell/kiosk-frame";
import { Icon } from "@/components/ui/icon";
import { Keypad } from "@/components/ui/keypad";
import { Plate } from "@/components/ui/plate";
import { Slots } from "@/components/ui/slots";
import type { Miss, Screen } from "@/lib/bench/schema";
import { showTicket } from "@/lib/codes/ticket-code";

type ScanState = Extract<Screen, { at: "scan" }>;

/** Year, running number, check digit: where a ticket number has its hyphens, and how long it is. */
const TICKET_SLOTS = 8;
const HYPHENS_AFTER = [2, 7];

/** Which ticket? It is shown to the camera, read by a scanner, keyed, or picked from a list. */
export function ScanScreen({
  state,
  tap,
  screen,
  onText,
}: Seen & { screen: ScanState; onText: (text: string) => void }) {
  const t = useTranslations("scan");
  const words = useTranslations("common");
  const { digits, says } = screen;
  const doubtAt = says && "doubtful" in says ? says.doubtful : null;
  return (
    <KioskFrame state={state}>
      <div className="grid min-h-0 grid-rows-[58px_minmax(0,1fr)_auto] portrait:grid-rows-[88px_minmax(0,1fr)_auto]">
        <Ask
          book={says ? t("again") : <ScanAsk screen={screen} />}
          day={<ScanSays says={says} digits={digits} />}
        />
        <div className="scan-leaves">
          <Camera onText={onText} />
          <div className="scan-keys">
            <Slots
              mono
              digits={digits}
              length={Math.max(TICKET_SLOTS, digits.length)}
              hyphensAfter={HYPHENS_AFTER}
              label={t("slots", { digits })}
              {...(doubtAt === null ? {} : { doubtAt })}
            />
            <Keypad
              onDigit={(digit) => tap({ on: "digit", digit })}
              onRubOut={() => tap({ on: "rub-out" })}
              onOk={() => tap({ on: "submit" })}
              okDisabled={digits === "" || state.finding !== null}
              okLabel={says ? t("tryAgain") : t("find")}
              rubOutLabel={words("rubOut")}
            />
          </div>
        </div>
        <Foot
          book={<ScanBack screen={screen} tap={tap} />}
          day={<ScanElse state={state} screen={screen} tap={tap} />}
        />
      </div>
    </KioskFrame>
  );
}

function ScanAsk({ screen }: { screen: ScanState }) {
  const t = useTranslations("scan");
  return { work: t("show"), add: t("showAdd"), reassign: t("showRight") }[screen.purpose.for];
}

/** What is wrong with what was read, in one breath with its number; else the other way to do it. */
function ScanSays({ says, digits }: { says: Miss | null; digits: string }) {
  const t = useTranslations("scan");
  if (!says) return t("key");
  return (
    <span className="flex items-center gap-3 text-danger" role="alert">
      <Icon name="loose" className="size-11 flex-none" />
      <span>{t(says.what, { ticket: showTicket(digits) })}</span>
    </span>
  );
}

function ScanBack({ screen, tap }: Pick<Seen, "tap"> & { screen: ScanState }) {
  const t = useTranslations("scan");
  const words = useTranslations("common");
  return (
    <>
      <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })}>
        {words("back")}
      </Plate>
      {screen.purpose.for === "reassign" && (
        <Plate icon="other-work" onClick={() => tap({ on: "show-other-work" })}>
          {t("otherWork")}
        </Plate>
      )}
    </>
  );
}

/** The way on without a readable code: the nearest known number, or the cell's list. */
function ScanElse({ state, screen, tap }: Seen & { screen: ScanState }) {
  const t = useTranslations("scan");
  const { says } = screen;
  const nearest = says && "nearest" in says ? says.nearest : null;
  if (nearest) {
    const known = state.tickets[nearest]?.ticket;
    return (
      <Plate
        icon="go"
        iconLast
        rim="right"
        onClick={() => tap({ on: "take-ticket", ticket: nearest })}
      >
        {t("nearest", { ticket: showTicket(nearest) })}
        <small>{t("takeIt", { model: known ? modelName(known) : "" })}</small>
      </Plate>
    );
  }
  return (
    <Plate icon="go" iconLast rim="right" onClick={() => tap({ on: "show-cell-tickets" })}>
      {t("noTicket")}
      <small>{t("pick")}</small>
    </Plate>
  );
}
