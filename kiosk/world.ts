import type { KioskClock } from "@/kiosk/clock";
import type { Outbox } from "@/kiosk/outbox";
import type { Store } from "@/kiosk/store";
import type { KioskState } from "@/lib/bench/schema";
import type { Input } from "@/lib/taps/inputs";

/** What the kiosk's parts share: its storage, its clock, the network, and the reducer's ear. */
export interface World {
  store: Store;
  outbox: Outbox;
  clock: KioskClock;
  fetcher: typeof fetch;
  newId(): string;
  state(): KioskState;
  send(input: Input): void;
  /** Tells the sender that a record waits. */
  nudge(): void;
}
