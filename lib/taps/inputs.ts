import type {
  BenchSession,
  Choice,
  CountField,
  Device,
  EnrolRefusal,
  ItemKey,
  KioskState,
  Link,
} from "@/lib/bench/schema";
import type { Language } from "@/lib/kiosks/languages";
import type { Bench, KioskCell, KioskTicket } from "@/lib/kiosks/schema";
import type { ClockEvent, EventBody } from "@/lib/ledger/schema";
import type { HandOverReason, SkipReason } from "@/lib/sheet/reasons";

/** What happens: the world's answers, time, and taps. */
export type Input =
  | { on: "started"; known: Known }
  | { on: "tick" }
  | { on: "touch" }
  | { on: "scan"; text: string }
  | { on: "cell"; cell: KioskCell }
  | { on: "link"; is: Link["is"] }
  | { on: "device"; device: Device }
  | { on: "enrolled"; device: Device }
  | { on: "enrol-refused"; says: EnrolRefusal }
  | { on: "signed-in"; session: BenchSession; bench: Bench | null }
  | { on: "sign-in-refused"; worker: string; says: "wrong" | "away"; waitSeconds: number | null }
  | { on: "bench"; worker: string; bench: Bench }
  | { on: "session-over"; worker: string }
  | { on: "ticket"; code: string; ticket: KioskTicket }
  | { on: "no-ticket"; code: string; away: boolean }
  | { on: "recorded"; events: readonly ClockEvent[] }
  | { on: "not-recorded" }
  | { on: "settled"; ids: readonly string[]; benches: Readonly<Record<string, Bench>> }
  | Tap;

export type Tap =
  | { on: "show-enrol" }
  | { on: "enrol"; code: string }
  | { on: "digit"; digit: string }
  | { on: "rub-out" }
  | { on: "submit" }
  | { on: "language"; language: Language }
  | { on: "mute"; muted: boolean }
  | { on: "back" }
  | { on: "leave" }
  | { on: "stay" }
  | { on: "undo" }
  | { on: "page"; page: number }
  | { on: "start-shift" }
  | { on: "say-in" }
  | { on: "scan-for"; add: boolean }
  | { on: "show-cell-tickets" }
  | { on: "take-ticket"; ticket: string }
  | { on: "take"; choice: Choice }
  | { on: "go-ahead" }
  | { on: "call-lead" }
  | { on: "pick-another" }
  | { on: "run" }
  | { on: "resume" }
  | { on: "show-break" }
  | { on: "break"; break: "meal" | "rest" }
  | { on: "end-break" }
  | { on: "show-other-work" }
  | { on: "other-work"; code: string }
  | { on: "count" }
  | { on: "pick-item"; item: ItemKey }
  | { on: "step"; field: CountField; by: 1 | -1 }
  | { on: "key-count"; field: CountField }
  | { on: "counted"; stop: boolean }
  | { on: "cause"; operation: string }
  | { on: "show-sheet"; item: ItemKey | null }
  | { on: "show-bench" }
  | { on: "pick-step"; step: string | null }
  | { on: "tap-off"; step: string }
  | { on: "take-back"; step: string }
  | { on: "skip-step"; step: string }
  | { on: "skip-because"; reason: SkipReason }
  | { on: "stop-here" }
  | { on: "put-aside" }
  | { on: "show-other-sheets" }
  | { on: "go-on"; item: ItemKey }
  | { on: "show-hand-over" }
  | { on: "hand-to"; to: string }
  | { on: "hand-because"; reason: HandOverReason }
  | { on: "key-pin" }
  | { on: "show-hours" }
  | { on: "wrong-ticket" }
  | { on: "wrong-count" }
  | { on: "object"; report: string }
  | { on: "end-shift" };

/** What the kiosk kept from before this page was loaded. */
export interface Known {
  device: Device | null;
  cell: KioskCell | null;
  sessions: readonly BenchSession[];
  benches: Readonly<Record<string, Bench>>;
  pending: readonly ClockEvent[];
}

/** What the reducer asks of the world; `kiosk/` does it and answers with an input. */
export type Effect =
  | {
      do: "record";
      bodies: readonly EventBody[];
      worker: string;
      session: string;
      /** The word why; it goes with every one of them. */
      note?: string;
    }
  | { do: "sign-in"; worker: string; pin: string }
  | { do: "find-ticket"; code: string; worker: string }
  | { do: "fetch-bench"; worker: string }
  | { do: "enrol"; code: string }
  | { do: "end-sessions"; worker: string }
  | { do: "mute"; muted: boolean }
  | { do: "sound"; sound: "accept" | "refuse" | "hold" };

/** A state and what is to be done next; the second is empty for most inputs. */
export type Step = readonly [KioskState, readonly Effect[]];
