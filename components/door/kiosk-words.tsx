"use client";

import { type ReactNode, useEffect, useState } from "react";
import { IntlProvider } from "use-intl";
import { spokenLanguage } from "@/lib/bench/language";
import type { KioskState } from "@/lib/bench/schema";
import type { Language } from "@/lib/kiosks/languages";
import { en } from "@/lib/messages/en";
import { loadMessages } from "@/lib/messages/load";
import type { Messages } from "@/lib/messages/schema";

/** The words and the clock of what is shown within: the language of whoever stands here. */
export function KioskWords({ state, children }: { state: KioskState; children: ReactNode }) {
  const language = spokenLanguage(state);
  const messages = useMessages(language);
  useEffect(() => {
    document.documentElement.lang = language;
  }, [language]);
  return (
    <IntlProvider
      locale={language}
      messages={messages}
      timeZone={state.cell?.rules.timeZone ?? state.device?.site.timeZone ?? "UTC"}
    >
      {children}
    </IntlProvider>
  );
}

/** The words of a language; until they are there, English. All are loaded, for the time offline. */
function useMessages(language: Language): typeof en {
  const [loaded, setLoaded] = useState<Partial<Record<Language, Messages>>>({});
  useEffect(() => {
    void loadMessages().then(setLoaded);
  }, []);
  // safe because every catalogue has English's keys and arguments, which a test proves
  return (loaded[language] ?? en) as typeof en;
}
