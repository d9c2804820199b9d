import type { Language } from "@/lib/kiosks/languages";
import type { Messages } from "@/lib/messages/schema";

/** Loads every language of the kiosk; each is a file of its own, fetched after the first screen. */
export async function loadMessages(): Promise<Record<Language, Messages>> {
  const [{ en }, { es }] = await Promise.all([
    import("@/lib/messages/en"),
    import("@/lib/messages/es"),
  ]);
  return { en, es };
}
