import { showTicket } from "@/lib/codes/ticket-code";
import { otherWorkWords } from "@/lib/ledger/other-work-words";

/** A record of the ledger as the office reads it: what was tapped, where, and by whom. */
export interface Tap {
  id: string;
  kind: string;
  atMs: number;
  receivedMs: number;
  kiosk: string | null;
  /** Who entered it for the worker. */
  by: string | null;
  /** Why it is kept and not counted; null where it is booked. */
  keptFor: string | null;
  /** What was last done about it: taken out, or moved, and to when; null where it stands as tapped. */
  corrected: { kind: "void" | "move"; toMs: number | null } | null;
  body: Record<string, unknown>;
}

/** What may be moved or taken out: whatever says or counts what somebody did. */
const correctable = [
  "shift-start",
  "shift-end",
  "break-start",
  "break-end",
  "work",
  "indirect",
  "pause",
  "report",
  "inspect",
  "hand-over",
  "insert",
];

/** Says whether a record can be moved or taken out: it counts, and was not taken out before. */
export function isCorrectable({ kind, keptFor, corrected }: Tap): boolean {
  return keptFor === null && corrected?.kind !== "void" && correctable.includes(kind);
}

const plain: Record<string, string> = {
  "shift-start": "shift started",
  "shift-end": "shift ended",
  "break-end": "back from the break",
  "caution-read": "caution read",
  reassign: "changed what it was booked to",
  undo: "undone",
  object: "called out as wrong",
  confirm: "agreed",
  settle: "settled",
  void: "taken out",
  move: "moved",
  release: "released",
  reading: "reading",
};

/** Says in words what a tap said: "run on 26-04817-6, 120 and 1 more". */
export function tapWords({ kind, body }: Pick<Tap, "kind" | "body">): string {
  switch (kind) {
    case "work":
      return `${text(body.activity)} on ${itemsText(body.items)}`;
    case "indirect":
      return otherWorkWords(text(body.code));
    case "pause":
      return `paused ${itemsText(body.items)}`;
    case "break-start":
      return `${text(body.break)} break`;
    case "report":
    case "inspect":
      return `${kind === "report" && body.stop === true ? "done" : "counted"}: ${counts(body)}`;
    case "insert":
      return isRecord(body.event)
        ? tapWords({ kind: text(body.event.kind), body: body.event })
        : "entered";
    default:
      return plain[kind] ?? kind.replaceAll("-", " ");
  }
}

function counts(body: Record<string, unknown>): string {
  return ["good", "rework", "scrap"]
    .map((each) => [Number(body[each] ?? 0), each] as const)
    .filter(([count, each]) => count > 0 || each === "good")
    .map(([count, each]) => `${count} ${each}`)
    .join(", ");
}

function itemsText(items: unknown): string {
  const list: readonly Record<string, unknown>[] = Array.isArray(items) ? items : [];
  const [first] = list;
  if (!first) return "nothing";
  const more = list.length > 1 ? ` and ${list.length - 1} more` : "";
  return `${showTicket(text(first.ticket))}, ${text(first.operation)}${more}`;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null;
}

function text(value: unknown): string {
  return typeof value === "string" ? value : "";
}
