"use client";

import { useTranslations } from "use-intl";
import type { Seen } from "@/components/bench/seen";
import { DoorLayout } from "@/components/door/door-layout";
import { Keypad } from "@/components/ui/keypad";
import { Board, Plate } from "@/components/ui/plate";
import { Slots } from "@/components/ui/slots";
import type { Screen } from "@/lib/bench/schema";
import type { Language } from "@/lib/kiosks/languages";

/** Each language is named in itself, so that everyone finds their own. */
const languages: readonly { language: Language; name: string }[] = [
  { language: "en", name: "English" },
  { language: "es", name: "Español" },
];

/** Slots that stand ready for a worker's number; a longer one grows into more. */
const SLOTS_READY = 4;

/** The door: idle and sign-in screen. A badge is shown or a number is keyed. */
export function DoorScreen({
  state,
  tap,
  screen,
  language,
}: Seen & { screen: Extract<Screen, { at: "door" }>; language: Language }) {
  const t = useTranslations("door");
  const words = useTranslations("common");
  const { digits, says } = screen;
  return (
    <DoorLayout
      state={state}
      tap={tap}
      badge={t("badge")}
      ask={<span className={says ? "text-danger" : ""}>{says ? t(says) : t("number")}</span>}
      slots={
        <Slots
          digits={digits}
          length={Math.min(8, Math.max(SLOTS_READY, digits.length + 1))}
          label={t("slots", { digits: digits || t("noDigits") })}
        />
      }
      pad={
        <Keypad
          onDigit={(digit) => tap({ on: "digit", digit })}
          onRubOut={() => tap({ on: "rub-out" })}
          onOk={() => tap({ on: "submit" })}
          okDisabled={digits === ""}
          okLabel={t("next")}
          rubOutLabel={words("rubOut")}
        />
      }
      foot={
        <fieldset aria-label={t("language")} className="contents">
          <Board>
            {languages.map((each, at) => (
              <Plate
                key={each.language}
                lang={each.language}
                rim={at === 0 ? "left" : "right"}
                aria-pressed={each.language === language}
                onClick={() => tap({ on: "language", language: each.language })}
                className="justify-center"
              >
                {each.name}
              </Plate>
            ))}
          </Board>
        </fieldset>
      }
    />
  );
}
