import type { LedgerRow } from "@/lib/ledger/decide";
import type { DerivedTimeline, NewSession } from "@/lib/ledger/decide-booking";
import { ticketsAbout } from "@/lib/ledger/target";
import { attendanceKey } from "@/lib/matching/mark-keys";
import { type Derived, ticketsTouched, timeTouched } from "@/lib/timeline/derive";

/** What a row gains so that the database can take it: instants as text, names as its columns. */
type Fields = Record<string, unknown>;

export interface Booking {
  siteId: string;
  kioskId: string | null;
  rows: readonly LedgerRow[];
  timelines: readonly DerivedTimeline[];
  sessions: readonly NewSession[];
  /** Who enters it in the office or on a phone, as the audit log names them; else it is a kiosk's. */
  actor?: string;
  /** Kept records that are answered with it. */
  answered?: readonly ReceiptEnd[];
  /** True where its rows were kept as `unproved` before, with their notes, and are proved now. */
  isAgain?: boolean;
}

/** A loose end of a record that was kept and not counted; instants are epoch milliseconds. */
export interface ReceiptEnd {
  code: string;
  subject: string;
  workerId: string | null;
  kioskId: string | null;
  atMs: number;
}

/** Writes bookings of one site as the one argument of the database's `book`. */
export function payloadOf(bookings: readonly Booking[]): string {
  return JSON.stringify(bookings.map(fieldsOf).reduce(joined));
}

/** Lists of the same name one after the other; objects of lists likewise. */
function joined(one: Fields, other: Fields): Fields {
  return Object.fromEntries(
    Object.entries(one).map(([name, value]) => [
      name,
      // safe because bookings have the same fields, and none but lists and objects of lists
      Array.isArray(value)
        ? [...value, ...(other[name] as unknown[])]
        : joined(value as Fields, other[name] as Fields),
    ]),
  );
}

function fieldsOf(booking: Booking): Fields {
  const { siteId, kioskId, timelines, rows, isAgain = false } = booking;
  const site = { site_id: siteId };
  const from = <T extends object>(
    pick: (derived: Derived) => readonly T[],
    name: (row: T) => Fields = columnsOf,
  ) =>
    timelines.flatMap(({ workerId, derived }) =>
      pick(derived).map((row) => ({ ...site, worker_id: workerId, ...name(row) })),
    );
  return {
    heads: timelines.map(({ workerId, window, derived }) => ({
      worker_id: workerId,
      version: window.version,
      as_of: instant(derived.asOfMs),
    })),
    [isAgain ? "again" : "events"]: rows.map((row) => ({ ...site, ...eventColumns(row, booking) })),
    [isAgain ? "events" : "again"]: [],
    notes: (isAgain ? [] : rows).flatMap(({ id, note }) =>
      note === null ? [] : [{ event_id: id, text: note }],
    ),
    sessions: booking.sessions.map((session) => ({ ...columnsOf(session), kiosk_id: kioskId })),
    gone: {
      segments: from(({ segments }) => segments.gone),
      shifts: from(({ shifts }) => shifts.gone),
      reports: from(({ reports }) => reports.gone),
      loose_ends: [
        ...from(({ looseEnds }) => looseEnds.gone),
        ...(isAgain ? rows.map(({ id }) => ({ code: "unproved", subject: id })) : []),
      ],
    },
    segments: from(({ segments }) => segments.changed),
    shifts: from(({ shifts }) => shifts.changed),
    reports: from(({ reports }) => reports.changed),
    loose_ends: [
      ...from(
        ({ looseEnds }) => looseEnds.changed,
        (row) => ({ ...columnsOf(row), source: "fold" }),
      ),
      ...rows.flatMap((row) => keptEnd(row, booking)),
      ...(booking.answered ?? []).map((end) => ({
        ...site,
        ...columnsOf(end),
        source: "receipt",
        settled: true,
      })),
    ],
    marks: [
      ...markedTickets(booking).map((key) => ({ kind: "ticket", key })),
      ...markedTime(booking).map((key) => ({ kind: "attendance", key })),
    ],
    audit: rows.flatMap((row) => auditOf(row, booking)),
  };
}

/** Tickets whose time, counts or answers change: to be judged again. */
function markedTickets({ timelines, rows }: Booking): string[] {
  const events = new Map(
    timelines.flatMap(({ window }) => window.events.map(({ id, body }) => [id, body] as const)),
  );
  const changed = timelines.flatMap(({ derived, window }) =>
    ticketsTouched(derived, window.segments),
  );
  const answered = rows.flatMap(({ targetId }) => ticketsAbout(targetId, events));
  return [...new Set([...changed, ...answered])];
}

/** Time in cells whose sums change. */
function markedTime({ timelines }: Booking): string[] {
  const touched = timelines.flatMap(({ derived, window }) => timeTouched(derived, window.segments));
  return [...new Set(touched.map(attendanceKey))];
}

/** `startMs` is the column `start_at`, `cellId` the column `cell_id`. */
function columnsOf(row: object): Fields {
  return Object.fromEntries(
    Object.entries(row).map(([name, value]) =>
      name.endsWith("Ms")
        ? [`${snake(name.slice(0, -2))}_at`.replace(/^at_at$/, "at"), instant(value)]
        : [snake(name), value],
    ),
  );
}

/** The names are few and each row asks for all of them. */
const columnNames = new Map<string, string>();

function snake(name: string): string {
  const known = columnNames.get(name);
  if (known) return known;
  const column = name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
  columnNames.set(name, column);
  return column;
}

function instant(ms: number | null): string | null {
  return ms === null ? null : new Date(ms).toISOString();
}

function eventColumns(row: LedgerRow, { kioskId }: Booking): Fields {
  const { uncertaintyMs, note, ...columns } = row;
  return {
    ...columnsOf(columns),
    uncertainty_ms: uncertaintyMs,
    kiosk_id: kioskId,
  };
}

/** A record that is kept and not counted hangs on its kiosk until a person settles it. */
function keptEnd(row: LedgerRow, { siteId, kioskId }: Booking): Fields[] {
  if (!row.keptFor) return [];
  return [
    {
      site_id: siteId,
      code: row.keptFor,
      subject: row.id,
      source: "receipt",
      worker_id: row.workerId,
      kiosk_id: kioskId,
      at: instant(row.atMs ?? row.receivedMs),
      settled: false,
    },
  ];
}

/** What is entered for somebody else, and whatever comes from no kiosk, is everybody's to see later. */
function auditOf({ by, id, kind, workerNumber, keptFor }: LedgerRow, { kioskId, actor }: Booking) {
  if (keptFor || (by === null && actor === undefined)) return [];
  return [
    {
      actor: actor ?? `kiosk:${kioskId}`,
      action: `records.${kind}`,
      subject: `event:${id}`,
      detail: { by, worker: workerNumber },
    },
  ];
}
