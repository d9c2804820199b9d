/** The languages in which a kiosk speaks; `lib/messages` has one catalogue each. */
export const languages = ["en", "es"] as const;
export type Language = (typeof languages)[number];

/** Reads a locale such as "es-MX" as one of the kiosk's languages; null where it speaks none such. */
export function languageOf(locale: string | null | undefined): Language | null {
  return languages.find((each) => each === locale?.slice(0, 2)) ?? null;
}
