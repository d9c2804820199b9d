"use client";

import { type FormEvent, useEffect, useState } from "react";
import { useTranslations } from "use-intl";
import type { Seen } from "@/components/bench/seen";
import { Mark } from "@/components/shell/mark";
import { PageGrain } from "@/components/ui/page-grain";
import { Purfling } from "@/components/ui/purfling";
import type { Screen } from "@/lib/bench/schema";

/** A browser that is no kiosk yet becomes one with the code that an admin made. */
export function EnrolScreen({
  tap,
  screen,
}: Pick<Seen, "tap"> & { screen: Extract<Screen, { at: "enrol" }> }) {
  const t = useTranslations("enrol");
  const [code, setCode] = useState("");
  useEffect(() => setCode(codeOf(window.location)), []);
  useEffect(() => {
    if (screen.isDone) window.location.assign("/kiosk");
  }, [screen.isDone]);
  const send = (event: FormEvent) => {
    event.preventDefault();
    if (code.trim()) tap({ on: "enrol", code });
  };
  return (
    <div className="kiosk leaves" style={{ gridTemplateRows: "minmax(0, 1fr)" }}>
      <PageGrain />
      <Purfling />
      <Mark className="on-seam door-mark" />
      <main className="z-3 grid grid-cols-2 content-center gap-y-10 portrait:content-start portrait:pt-64">
        <h1 className="pr-10 pl-8 text-right text-k-5 font-bold leading-none">{t("title")}</h1>
        <p className="max-w-[460px] self-end pr-8 pl-10 text-k-2">{t("how")}</p>
        <label
          htmlFor="enrol-code"
          className="h-touch self-start pr-10 pl-8 text-right text-k-4 font-bold leading-[112px]"
        >
          {t("code")}
        </label>
        <form onSubmit={send} className="grid gap-6 pr-8 pl-10">
          <input
            id="enrol-code"
            name="code"
            value={code}
            onChange={(event) => setCode(event.target.value)}
            autoComplete="off"
            autoCapitalize="characters"
            spellCheck={false}
            maxLength={32}
            aria-invalid={screen.says === "wrong"}
            aria-describedby="enrol-says"
            className="h-touch border-[1.5px] border-line-strong border-b-4 border-b-ink bg-raised px-5 font-mono text-k-4 uppercase"
          />
          <button
            type="submit"
            disabled={screen.busy || code.trim() === ""}
            className="plate"
            data-tone="solid"
            data-rim="right"
          >
            {screen.busy ? t("busy") : t("go")}
          </button>
          <p id="enrol-says" role="status" className="min-h-[64px] text-k-2 font-bold text-danger">
            {screen.says && t(screen.says)}
          </p>
        </form>
      </main>
    </div>
  );
}

/** The code that the address carries, as the admin's QR code does: `?code=` or `#`. */
function codeOf({ search, hash }: Location): string {
  return new URLSearchParams(search).get("code") ?? decodeURIComponent(hash.slice(1));
}
