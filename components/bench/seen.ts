import { useTimeZone } from "use-intl";
import type { KioskState } from "@/lib/bench/schema";
import type { BenchView } from "@/lib/bench/view";
import type { Tap } from "@/lib/taps/inputs";
import { clockText } from "@/lib/time/format";

/** What every screen of the kiosk is drawn from, and how it answers. */
export interface Seen {
  state: KioskState;
  tap(tap: Tap): void;
}

/** The same for a screen behind the door: someone stands there. */
export interface SeenBench extends Seen {
  view: BenchView;
}

/** Writes an instant (epoch milliseconds) as the site's clock shows it, "09:42". */
export function useClock(): (atMs: number) => string {
  const zone = useTimeZone() ?? "UTC";
  return (atMs) => clockText(Math.floor(atMs), zone);
}
