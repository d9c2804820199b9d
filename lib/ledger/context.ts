import type { Held } from "@/lib/access/may";
import type { ServedCell } from "@/lib/ledger/act-cell";
import type { KnownSession } from "@/lib/ledger/admit";
import type { StandardRow } from "@/lib/standards/in-force";
import type { DerivedRows, LooseEndRow, SegmentRow } from "@/lib/timeline/rows";
import type { LedgerEvent, SiteRules } from "@/lib/timeline/schema";

/** What is known of a ticket operation when a batch is booked or a bench is shown. */
export interface ItemFacts {
  ticket: string;
  operation: string;
  quantity: number;
  status: "open" | "finished" | "scrapped" | "cancelled";
  dueOn: string | null;
  model: string;
  options: string[];
  /** The operation's own name, cell and dangers. */
  name: string;
  cellId: string;
  shareBy: "standard" | "equal";
  hazards: string[];
  /** The base and the adders of the ticket's own options. */
  standards: StandardRow[];
  /** Where it is built in steps: what each weighs when it is tapped off. */
  steps?: { step: string; seconds: number }[];
  good: number;
  scrap: number;
  /** Pieces lost at operations before this one. */
  earlierScrap: number;
  firstWorkMs: number | null;
  firstReportMs: number | null;
  /** All time booked to it, by worker; `sinceMs` where the worker is on it now. */
  booked: {
    workerId: string;
    seconds: number;
    sinceMs: number | null;
    weight: number | null;
    total: number | null;
  }[];
}

/** One worker's events and derived rows around the touched instants, both ends included. */
export interface Window extends DerivedRows {
  workerId: string;
  firstMs: number;
  lastMs: number;
  /** No gap was found as far as was looked: ask again and look further. */
  truncated: boolean;
  version: number;
  /** As of when the timeline was last derived; null before the first time. */
  asOfMs: number | null;
  homeCellId: string;
  events: (LedgerEvent & { note?: string | null })[];
  planned: { startMs: number; endMs: number }[];
  /** What only a bench shows: the judge's questions, the day before the window, the last sign-in. */
  judged: LooseEndRow[];
  earlier: SegmentRow[];
  seenMs: number | null;
}

/** A ticket operation that a kiosk's cells could take up next. */
interface NextWork {
  ticket: string;
  operation: string;
  name: string;
  model: string;
  options: string[];
  quantity: number;
  openQuantity: number;
  dueOn: string | null;
}

interface ContextWorker {
  id: string;
  number: string;
  homeCellId: string;
  held: Held[];
}

/** All that booking a batch must know, of one moment. */
export interface BookingContext {
  workers: ContextWorker[];
  sessions: KnownSession[];
  /** The ids of the batch that are in the ledger already. */
  known: { id: string; bodyHash: string; keptFor: string | null; questions: string[] | null }[];
  served: ServedCell[];
  rules: SiteRules[];
  windows: Window[];
  facts: ItemFacts[];
  next: NextWork[];
}
