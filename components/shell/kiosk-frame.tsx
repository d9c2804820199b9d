"use client";

import type { ReactNode } from "react";
import { useTranslations } from "use-intl";
import { type Seen, useClock } from "@/components/bench/seen";
import { personName } from "@/components/bench/words";
import { SmallMark } from "@/components/shell/mark";
import { Icon } from "@/components/ui/icon";
import { Purfling } from "@/components/ui/purfling";
import type { KioskState } from "@/lib/bench/schema";
import { stayOf } from "@/lib/bench/time-out";

/**
 * The frame of every screen behind the door: who stands here on the book's leaf, connection and
 * clock on the day's, the mark on the seam, and the seam that burns down before the screen goes.
 */
export function KioskFrame({ state, children }: Pick<Seen, "state"> & { children: ReactNode }) {
  const t = useTranslations("frame");
  const clock = useClock();
  const worker = state.visit?.worker ?? "";
  return (
    <div className="kiosk leaves">
      <SignOutSeam state={state} />
      <header className="mirror relative z-3 h-[68px] items-center px-8 portrait:h-[84px]">
        <div className="flex items-baseline gap-4 pr-10 text-left portrait:block">
          <b className="truncate text-k-2">{personName(state, worker)}</b>
          {worker && (
            <span className="truncate text-ink-2 portrait:block">
              {t("who", { worker, kiosk: state.device?.name ?? "" })}
            </span>
          )}
        </div>
        <div className="flex items-center justify-end gap-4">
          <LinkTag state={state} />
          <b className="text-k-3">{clock(state.nowMs)}</b>
        </div>
        <SmallMark className="on-seam top-2 h-14 w-[46px]" />
      </header>
      <main className="grid min-h-0">{children}</main>
      {state.notKept && (
        <p
          role="alert"
          className="absolute inset-x-0 top-0 z-10 bg-danger p-5 text-center text-k-2 font-bold text-on-danger"
        >
          {t("notKept")}
        </p>
      )}
    </div>
  );
}

/** The page's seam; it burns for the last half of a screen's time, and a touch fills it again. */
export function SignOutSeam({ state }: Pick<Seen, "state">) {
  const stay = stayOf(state);
  if (!stay) return <Purfling />;
  const seconds = (stay.untilMs - stay.fromMs) / 1000;
  const burn = { seconds: seconds / 2, waitSeconds: seconds / 2 };
  return <Purfling key={`${state.screen.at} ${stay.fromMs}`} burn={burn} />;
}

/** The connection and what waits here: no red and nothing in the way, for records are safe. */
export function LinkTag({ state, rows = false }: Pick<Seen, "state"> & { rows?: boolean }) {
  const t = useTranslations("frame");
  const clock = useClock();
  const { link } = state;
  const count = state.pending.length;
  const isApart = link.is !== "connected";
  const kept =
    link.is === "unknown-device" ? t("unknownDeviceKept", { count }) : t("kept", { count });
  return (
    <span role="status" className="grid justify-items-end text-right leading-tight">
      <span className={`tag ${isApart ? "" : "text-actual"}`}>
        <Icon name={isApart ? "saved-here" : "connected"} />
        {linkWord(state, { t, since: clock(link.sinceMs) })}
      </span>
      {(rows || isApart) && (isApart || count > 0) && <span className="text-ink-2">{kept}</span>}
    </span>
  );
}

type FrameWords = ReturnType<typeof useTranslations<"frame">>;

function linkWord(
  { link, pending }: KioskState,
  { t, since }: { t: FrameWords; since: string },
): string {
  if (link.is === "unknown-device") return t("unknownDevice");
  if (link.is === "away") return t("away", { time: since });
  return pending.length > 0 ? t("handingIn", { count: pending.length }) : t("connected");
}
