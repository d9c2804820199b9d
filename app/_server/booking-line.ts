import "server-only";
import type { Scope } from "@/db/client";
import { type BookedBatch, bookBatches, type IncomingBatch } from "@/db/ledger/commands";
import type { Result } from "@/lib/result";

/** A batch that stands in line, and whoever waits for its answer. */
interface Waiting {
  scope: Scope;
  batch: IncomingBatch;
  answer: (booked: Result<BookedBatch>) => void;
  fail: (error: unknown) => void;
}

/** As many records as one batch may bring (API.md). */
const TOGETHER_MAX = 500;
/** While one group is written, the next is decided. */
const AT_ONCE = 2;

/** By site: who waits, and how many groups are being booked. */
const lines = new Map<string, { waiting: Waiting[]; underWay: number }>();

/**
 * Books a batch, together with what other kiosks of the site hand in at the same time: whoever comes
 * while others are being booked waits for them and goes with the next group. Alone, nobody waits.
 */
export function bookInLine(scope: Scope, batch: IncomingBatch): Promise<Result<BookedBatch>> {
  return new Promise((answer, fail) => {
    const line = lines.get(scope.siteId) ?? { waiting: [], underWay: 0 };
    lines.set(scope.siteId, line);
    line.waiting.push({ scope, batch, answer, fail });
    void advance(scope.siteId);
  });
}

async function advance(siteId: string): Promise<void> {
  const line = lines.get(siteId);
  if (!line || line.underWay >= AT_ONCE || line.waiting.length === 0) return;
  line.underWay += 1;
  await bookGroup(line.waiting.splice(0, groupSize(line.waiting)));
  line.underWay -= 1;
  await advance(siteId);
  if (line.underWay === 0 && line.waiting.length === 0) lines.delete(siteId);
}

/** How many from the front of the line go together: as many as one batch could bring, at least one. */
function groupSize(waiting: readonly Waiting[]): number {
  let records = 0;
  const end = waiting.findIndex(({ batch }) => {
    records += batch.events.length;
    return records > TOGETHER_MAX;
  });
  return end === -1 ? waiting.length : Math.max(1, end);
}

/** Where a group cannot be booked, each is tried alone, so that nobody pays for another's batch. */
async function bookGroup(group: readonly Waiting[]): Promise<void> {
  const [first] = group;
  if (!first) return;
  try {
    const booked = await bookBatches(
      first.scope,
      group.map(({ batch }) => batch),
    );
    // safe because there is one answer a batch
    group.forEach(({ answer }, at) => {
      answer(booked[at]!);
    });
  } catch (error) {
    if (group.length === 1) first.fail(error);
    else for (const one of group) await bookGroup([one]);
  }
}
