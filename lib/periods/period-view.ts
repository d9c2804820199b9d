import type { FileTotals } from "@/lib/periods/file";
import type { PeriodView } from "@/lib/periods/schema";

/** A period as the database has it, with its last closing. */
export interface PeriodFacts {
  id: string;
  from: string;
  to: string;
  revision: number;
  isClosed: boolean;
  closedAt: Date | null;
  closedBy: string | null;
  digest: string | null;
  totals: FileTotals | null;
}

/** Shows a period to programs; a closing that was reopened is told by its number alone. */
export function periodViewOf(period: PeriodFacts): PeriodView {
  const { id, from, to, revision, isClosed, closedAt, closedBy, digest, totals } = period;
  return {
    id,
    from,
    to,
    status: isClosed ? "closed" : "open",
    revision,
    closedAt: isClosed ? (closedAt?.toISOString() ?? null) : null,
    closedBy: isClosed ? closedBy : null,
    digest: isClosed ? digest : null,
    totals: isClosed ? totals : null,
  };
}
