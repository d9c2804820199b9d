import type { KioskState } from "@/lib/bench/schema";
import { type Language, languageOf } from "@/lib/kiosks/languages";

/**
 * The language of the screen: the one chosen at the door, else the worker's own, else the site's,
 * else English.
 */
export function spokenLanguage(state: KioskState): Language {
  const { screen, visit } = state;
  const worker = screen.at === "pin" ? screen.worker : visit?.worker;
  const person = state.cell?.people.find((each) => each.worker === worker);
  const own = worker ? (state.sessions[worker]?.language ?? person?.language) : undefined;
  const wanted = [state.language, own, state.device?.site.locale];
  return wanted.map(languageOf).find((each) => each !== null) ?? "en";
}
