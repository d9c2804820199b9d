import { sql } from "drizzle-orm";
import type { Scope } from "@/db/client";
import {
  type KeptBooked,
  type KeptMatched,
  type KeptOver,
  listRivals,
  listShares,
  type PartsContext,
  readPartsContext,
} from "@/db/seam/read-parts";
import type { SharesOf } from "@/lib/matching/booked";
import { operationDayKey } from "@/lib/matching/mark-keys";
import { UNKNOWN } from "@/lib/matching/parts";
import type { SetupTime } from "@/lib/matching/setups";
import { type PartedTicket, ticketParts } from "@/lib/matching/ticket-parts";
import type { TicketBook } from "@/lib/tickets/book";
import { productionDay } from "@/lib/time/site-day";
import { type Difference, difference } from "@/lib/timeline/difference";

/** What must be written so that the kept parts are what the books say. */
interface PartChanges {
  booked: Difference<KeptBooked>;
  matched: Difference<KeptMatched>;
  over: Difference<KeptOver>;
}

/**
 * Keeps the parts that some judged tickets give to standard and actual, and marks the days whose
 * sums change. Called in the transaction that holds the tickets' locks.
 *
 * @returns how many rows changed
 */
export async function keepParts(scope: Scope, books: readonly TicketBook[]): Promise<number> {
  const numbers = books.map(({ ticket }) => ticket);
  const context = await readPartsContext(scope, numbers);
  const sharesOf = await sharesOfCut(scope, books, context);
  const parted = await partAll(scope, { books, context, sharesOf });
  const changes = changesOf(parted, context);
  const marks = [
    ...marksOf("booked", [changes.booked, context.booked]),
    ...marksOf("matched", [changes.matched, context.matched]),
    ...parted.disturbed.map((key) => ({ kind: "ticket", key })),
  ];
  const count = [changes.booked, changes.matched, changes.over].reduce(
    (total, { gone, changed }) => total + gone.length + changed.length,
    0,
  );
  if (count + marks.length > 0) await writeParts(scope, changes, marks);
  return count;
}

/** Where an interval of several items lies on more than one production day, its shares are read. */
async function sharesOfCut(
  scope: Scope,
  books: readonly TicketBook[],
  { rules }: PartsContext,
): Promise<SharesOf> {
  const cut = books.flatMap(({ work }) =>
    work.filter(
      ({ startMs, endMs }) =>
        endMs !== null && productionDay(startMs, rules) !== productionDay(endMs - 1, rules),
    ),
  );
  const found = cut.length > 0 ? await listShares(scope, cut) : [];
  const known = new Map(found.map((one) => [`${one.worker} ${one.startMs}`, one.shares]));
  return ({ worker, startMs }) => known.get(`${worker} ${startMs}`) ?? null;
}

interface Parting {
  books: readonly TicketBook[];
  context: PartsContext;
  sharesOf: SharesOf;
}

interface Parted {
  tickets: Map<string, PartedTicket>;
  /** Other tickets whose setups these may have taken, or given back. */
  disturbed: string[];
}

/**
 * Works out the parts of all tickets. Where setups are earned when they are booked, tickets of one
 * cell and day compete: those places are locked first, and read in a later statement.
 */
async function partAll(scope: Scope, { books, context, sharesOf }: Parting): Promise<Parted> {
  const whenBooked = new Set(context.whenBooked);
  const facts = { rules: context.rules, whenBooked, sharesOf };
  const partsWith = (rivals: readonly SetupTime[]) =>
    new Map(books.map((book) => [book.ticket, ticketParts(book, { ...facts, rivals })]));
  const first = partsWith([]);
  if (whenBooked.size === 0) return { tickets: first, disturbed: [] };
  const now = [...first.values()].flatMap(({ setups }) => setups);
  const before = context.booked.flatMap((part) =>
    part.activity === "setup" && part.firstMs !== null && whenBooked.has(part.operation)
      ? [{ ...part, firstMs: part.firstMs }]
      : [],
  );
  const places = [...new Set([...before, ...now].map(placeOf))].sort();
  if (places.length === 0) return { tickets: first, disturbed: [] };
  await lock(scope, places);
  const groups = [...new Map([...before, ...now].map((one) => [placeOf(one), one])).values()];
  const others = await listRivals(scope, groups, [...first.keys()]);
  const tickets = new Map(
    books.map((book) => {
      const rivals = [...others, ...now.filter(({ ticket }) => ticket !== book.ticket)];
      return [book.ticket, ticketParts(book, { ...facts, rivals })];
    }),
  );
  const changed = changedPlaces(before, now);
  const disturbed = others.filter((one) => changed.has(placeOf(one))).map(({ ticket }) => ticket);
  return { tickets, disturbed: [...new Set(disturbed)] };
}

function placeOf({ operation, day, cell }: Omit<SetupTime, "ticket" | "firstMs">): string {
  return `setup ${day} ${cell} ${operation}`;
}

/** The places where some ticket's setup time is new, gone, or begins at another moment. */
function changedPlaces(before: readonly SetupTime[], now: readonly SetupTime[]): Set<string> {
  const textOf = (one: SetupTime) => `${placeOf(one)} ${one.ticket} ${one.firstMs}`;
  const [was, is] = [new Set(before.map(textOf)), new Set(now.map(textOf))];
  const changed = [
    ...before.filter((one) => !is.has(textOf(one))),
    ...now.filter((one) => !was.has(textOf(one))),
  ];
  return new Set(changed.map(placeOf));
}

async function lock({ db, siteId }: Scope, keys: readonly string[]): Promise<void> {
  await db.execute(sql`
    select pg_advisory_xact_lock(hashtextextended(${siteId}::text || k.key, 0))
    from unnest(${sql.param(keys)}::text[]) as k (key)`);
}

function changesOf({ tickets }: Parted, context: PartsContext): PartChanges {
  const owners = new Map(context.owners.map((owner) => [owner.ticket, owner]));
  const ownerOf = (ticket: string) =>
    owners.get(ticket) ?? { ticket, modelId: UNKNOWN, optionIds: [] };
  const of = <P extends object>(pick: (parts: PartedTicket) => readonly P[]) =>
    [...tickets].flatMap(([ticket, parts]) =>
      pick(parts).map((part) => ({ ...part, ...ownerOf(ticket) })),
    );
  return {
    booked: difference(
      context.booked,
      of(({ booked }) => booked),
      (one) => `${one.ticket} ${one.day} ${one.cell} ${one.activity} ${one.operation}`,
    ),
    matched: difference(
      context.matched,
      of(({ matched }) => matched),
      (one) => `${one.ticket} ${one.cell} ${one.rework} ${one.operation}`,
    ),
    over: difference(
      context.over,
      of(({ over }) => over),
      (one) => `${one.ticket} ${one.operation}`,
    ),
  };
}

type DayRow = { ticket: string; operation: string; day: string };

/** The days that lose or gain: those of the rows as they were, and as they are. */
function marksOf<R extends DayRow>(
  kind: "booked" | "matched",
  [{ gone, changed }, kept]: readonly [Difference<R>, readonly R[]],
) {
  const operations = new Set(changed.map(({ ticket, operation }) => `${ticket} ${operation}`));
  const was = kept.filter(({ ticket, operation }) => operations.has(`${ticket} ${operation}`));
  const keys = new Set([...gone, ...was, ...changed].map(operationDayKey));
  return [...keys].map((key) => ({ kind, key }));
}

/** Writes what differs, and the marks with it, in one statement. */
async function writeParts(
  { db, siteId }: Scope,
  changes: PartChanges,
  marks: readonly { kind: string; key: string }[],
): Promise<void> {
  const payload = JSON.stringify({ ...changes, marks });
  await db.execute(sql`select keep_parts(${siteId}, ${payload}::jsonb)`);
}
