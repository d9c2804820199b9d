"use client";

import { useTranslations } from "use-intl";
import type { Seen } from "@/components/bench/seen";
import { personName } from "@/components/bench/words";
import { DoorLayout } from "@/components/door/door-layout";
import { Keypad } from "@/components/ui/keypad";
import { Plate } from "@/components/ui/plate";
import { Slots } from "@/components/ui/slots";
import type { KioskState, Screen } from "@/lib/bench/schema";

type PinScreenState = Extract<Screen, { at: "pin" }>;

const PIN_SLOTS = 6;

/** The PIN of whoever stands here; the same words whether number or PIN was wrong. */
export function PinScreen({ state, tap, screen }: Seen & { screen: PinScreenState }) {
  const t = useTranslations("pin");
  const words = useTranslations("common");
  const { digits, busy, waitUntilMs, reason } = screen;
  const isWaiting = busy || waitUntilMs !== null;
  const okLabel = { enter: t("enter"), "end-shift": t("end"), reassign: t("go") }[reason.for];
  return (
    <DoorLayout
      state={state}
      tap={tap}
      ask={<PinAsk state={state} screen={screen} />}
      badge={
        <>
          <code className="block">{screen.worker}</code>
          {personName(state, screen.worker)}
        </>
      }
      slots={
        <Slots
          hidden
          digits={digits}
          length={PIN_SLOTS}
          label={t("slots", { count: digits.length })}
        />
      }
      pad={
        <Keypad
          onDigit={(digit) => tap({ on: "digit", digit })}
          onRubOut={() => tap({ on: "rub-out" })}
          onOk={() => tap({ on: "submit" })}
          okDisabled={digits === "" || isWaiting}
          okLabel={busy ? t("busy") : okLabel}
          rubOutLabel={words("rubOut")}
        />
      }
      foot={
        <Plate icon="back" rim="left" onClick={() => tap({ on: "back" })} className="w-full">
          {reason.for === "enter" ? t("notYou") : words("back")}
        </Plate>
      }
    />
  );
}

function PinAsk({ state, screen }: { state: KioskState; screen: PinScreenState }) {
  const t = useTranslations("pin");
  const { says, waitUntilMs, reason, worker } = screen;
  if (waitUntilMs !== null) {
    const seconds = Math.max(1, Math.ceil((waitUntilMs - state.nowMs) / 1000));
    return <span className="text-danger">{t("wait", { seconds })}</span>;
  }
  if (says) return <span className="text-danger">{t(says)}</span>;
  if (reason.for === "end-shift") return t("askEnd");
  if (reason.for === "reassign") return t("askReassign");
  const known = personName(state, worker);
  return known ? t("askName", { name: known }) : t("ask");
}
