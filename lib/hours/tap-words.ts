import { otherWorkWords } from "@/lib/ledger/other-work-words";

/** One record of the ledger as the office reads it. Instants are epoch milliseconds. */
export interface Tap {
  id: string;
  kind: string;
  /** The instant it counts at; null where it cannot be told. */
  atMs: number | null;
  receivedMs: number;
  /** The tablet's name; null for the office. */
  kiosk: string | null;
  /** Number of the lead who entered it for the worker. */
  by: string | null;
  /** Why it is kept and not counted; null where it is booked. */
  keptFor: string | null;
  body: Readonly<Record<string, unknown>>;
  note: string | null;
}

const plain: Record<string, string> = {
  "shift-start": "Shift started",
  "shift-end": "Shift ended",
  pause: "Put aside",
  "hand-over": "Handed over",
  "caution-read": "Caution read",
  reading: "Reading taken",
  undo: "Took a record back",
  object: "Called a record wrong",
  confirm: "Confirmed",
  settle: "Settled a question",
  void: "Took a record out",
  move: "Moved a record in time",
  insert: "Entered a record",
  release: "Released a hold",
  "step-done": "Tapped a step off",
  "step-open": "Took a step back",
  "step-skip": "Skipped a step",
};

/** Says in words what was tapped. A kind that this version does not know is shown as it is. */
export function tapWords({ kind, body }: Pick<Tap, "kind" | "body">): string {
  switch (kind) {
    case "work":
      return `Work, ${text(body.activity) || "run"}`;
    case "indirect":
      return `Other work, ${otherWorkWords(text(body.code) || null)}`;
    case "break-start":
      return body.break === "meal" ? "Meal started" : "Rest started";
    case "break-end":
      return body.break === "meal" ? "Meal ended" : "Rest ended";
    case "reassign":
      return "Put right: it was something else";
    case "report":
    case "inspect":
      return countWords(body);
    default:
      return plain[kind] ?? kind;
  }
}

function countWords(body: Tap["body"]): string {
  const counts = ["good", "rework", "scrap"].flatMap((name) => {
    const count = Number(body[name] ?? 0);
    return count > 0 ? [`${count} ${name}`] : [];
  });
  const counted = counts.length > 0 ? `Counted ${counts.join(", ")}` : "Counted nothing";
  return body.stop === true ? `${counted}, done` : counted;
}

const text = (value: unknown) => (typeof value === "string" ? value : "");
