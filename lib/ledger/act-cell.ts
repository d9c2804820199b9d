/** A cell that a kiosk serves from an instant on. */
export interface ServedCell {
  cellId: string;
  fromMs: number;
  position: number;
}

/**
 * The cells that a kiosk served at an instant, the first one first: the rows of the latest instant
 * up to it, or of the earliest where it is older than all. Empty for a kiosk without cells.
 */
export function cellsServedAt(served: readonly ServedCell[], atMs: number): string[] {
  const instants = served.map(({ fromMs }) => fromMs);
  const current = Math.max(...instants.filter((fromMs) => fromMs <= atMs));
  const fromMs = Number.isFinite(current) ? current : Math.min(...instants);
  return served
    .filter((row) => row.fromMs === fromMs)
    .sort((a, b) => a.position - b.position)
    .map(({ cellId }) => cellId);
}

/**
 * The cell that an act belongs to (LEDGER.md 4): of the kiosk's cells the operation's, else the
 * kiosk's first; a lead's entry belongs to the operation's cell wherever it was made. Null where
 * that cannot be told; the fold then takes the cell of the act before.
 */
export function actCell(act: {
  served: readonly string[];
  operationCell: string | null;
  isByLead: boolean;
}): string | null {
  const { served, operationCell, isByLead } = act;
  if (isByLead || (operationCell && served.includes(operationCell))) return operationCell;
  return served[0] ?? operationCell;
}
