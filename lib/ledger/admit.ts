import { cellsOf, type Held, reachOf } from "@/lib/access/may";
import type { Placed } from "@/lib/ledger/place";
import type { ClockEvent, keptCodes } from "@/lib/ledger/schema";

/** Why a record is kept and not counted (LEDGER.md 6). */
export type KeptCode = (typeof keptCodes)[number];

/** What booking knows of a worker whom an event names. */
interface KnownWorker {
  id: string;
  number: string;
  homeCellId: string;
  held: readonly Held[];
}

/** A session that was opened on the kiosk that hands the event in. */
export interface KnownSession {
  id: string;
  workerId: string;
  openedMs: number;
  endedMs?: number | null;
}

/** What is known around one event when it is judged at the door of the ledger. */
export interface Known {
  isRevoked: boolean;
  kioskCells: readonly string[];
  worker: KnownWorker | undefined;
  /** The lead who entered it for the worker; undefined where nobody did, or nobody known. */
  by: KnownWorker | undefined;
  session: KnownSession | undefined;
}

/** Kinds that change what somebody did: only a lead's session proves them. */
const leadOnly: ReadonlySet<string> = new Set(["void", "move", "insert", "settle", "release"]);

/**
 * Decides whether a readable, new event is booked (null) or kept until a person settles it, and
 * why. The first reason counts: the kiosk, then the worker, then the proof, then the clock.
 */
export function keptFor(event: ClockEvent, placed: Placed, known: Known): KeptCode | null {
  if (known.isRevoked) return "revoked";
  if (!known.worker) return "unknown-worker";
  if (!isProved(event, known, known.worker)) return "unproved";
  return placed.isFuture ? "future" : null;
}

function isProved(event: ClockEvent, known: Known, worker: KnownWorker): boolean {
  const author = event.by === undefined ? worker : known.by;
  if (!author || known.session?.workerId !== author.id) return false;
  if (event.by === undefined) return !leadOnly.has(event.kind);
  return mayCorrect(author.held, [worker.homeCellId, ...known.kioskCells]);
}

/** A lead enters for the people of the own cells, and for whoever works in one of them. */
function mayCorrect(held: readonly Held[], cells: readonly string[]): boolean {
  const reach = reachOf(held, "records.correct");
  if (reach === "site") return true;
  return reach === "cells" && cellsOf(held).some((cell) => cells.includes(cell));
}
