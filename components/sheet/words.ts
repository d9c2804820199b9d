import { useTranslations } from "use-intl";
import { handOverReasons, skipReasons } from "@/lib/sheet/reasons";

/** Says why a step does not apply; a word that the kiosk does not have is shown as it is. */
export function useSkipReason(): (reason: string | null) => string {
  const t = useTranslations("sheet");
  return (reason) => {
    const known = skipReasons.find((each) => each === reason);
    return known ? t(known) : (reason ?? t("skipped"));
  };
}

/** Says why an instrument was handed over; a word that the kiosk does not have as it is. */
export function useHandOverReason(): (reason: string | null) => string {
  const t = useTranslations("handOver");
  return (reason) => {
    const known = handOverReasons.find((each) => each === reason);
    return known ? t(known) : (reason ?? "");
  };
}
