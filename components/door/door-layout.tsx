"use client";

import type { ReactNode } from "react";
import { useLocale, useTimeZone, useTranslations } from "use-intl";
import { type Seen, useClock } from "@/components/bench/seen";
import { UndoBar } from "@/components/bench/undo-bar";
import { LinkTag, SignOutSeam } from "@/components/shell/kiosk-frame";
import { Mark } from "@/components/shell/mark";
import { Icon } from "@/components/ui/icon";
import { PageGrain } from "@/components/ui/page-grain";

/** The door's two leaves: the site, its clock and the badge left, a number pad right. */
export function DoorLayout({
  state,
  tap,
  ask,
  slots,
  foot,
  pad,
  badge,
}: Seen & {
  ask: ReactNode;
  slots: ReactNode;
  foot: ReactNode;
  pad: ReactNode;
  /** what stands beside the picture of a badge */
  badge: ReactNode;
}) {
  return (
    <div className="kiosk leaves" style={{ gridTemplateRows: "minmax(0, 1fr)" }}>
      <PageGrain />
      <SignOutSeam state={state} />
      <Mark className="on-seam door-mark" />
      <main className="door">
        {state.undo ? (
          <div className="door-undo">
            <UndoBar state={state} tap={tap} className="w-full" />
          </div>
        ) : (
          <>
            <p className="door-place">
              <b className="block truncate text-k-2">{state.device?.site.name}</b>
              <span className="block truncate text-ink-2">{state.device?.name}</span>
            </p>
            <div className="door-link">
              <LinkTag state={state} />
              <MuteButton state={state} tap={tap} />
            </div>
          </>
        )}
        <div className="door-leaf">
          <DoorClock state={state} />
          <p className="door-badge">
            <span className="max-w-[340px] [text-wrap:balance]">{badge}</span>
            <Icon name="badge" />
          </p>
          <div className="door-foot">{foot}</div>
        </div>
        <div className="door-leaf">
          <div className="door-ask">
            <h1 aria-live="polite" className="text-k-4 font-bold leading-[1.08]">
              {ask}
            </h1>
            {slots}
          </div>
          <div className="door-pad">{pad}</div>
        </div>
      </main>
    </div>
  );
}

function DoorClock({ state }: Pick<Seen, "state">) {
  const clock = useClock();
  const language = useLocale();
  const zone = useTimeZone() ?? "UTC";
  const [hours, minutes] = clock(state.nowMs).split(":");
  // English as the hall says it: the day before the month, without commas.
  const day = new Intl.DateTimeFormat(language === "en" ? "en-GB" : language, {
    timeZone: zone,
    weekday: "long",
    day: "numeric",
    month: "long",
  });
  return (
    <p className="door-time">
      <b>
        <span>{hours}</span>
        <i>:</i>
        <span>{minutes}</span>
      </b>
      <span>{day.format(state.nowMs).replace(",", "")}</span>
    </p>
  );
}

function MuteButton({ state, tap }: Seen) {
  const t = useTranslations("frame");
  const muted = state.device?.muted ?? false;
  return (
    <button
      type="button"
      data-minor=""
      aria-label={muted ? t("unmute") : t("mute")}
      onClick={() => tap({ on: "mute", muted: !muted })}
      className="-mt-5 -mr-5 grid size-touch-min flex-none place-items-center text-ink-2"
    >
      <Icon name={muted ? "sound-off" : "sound"} className="size-9" />
    </button>
  );
}
