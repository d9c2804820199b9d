/** What must be written so that `before` becomes `after`. */
export interface Difference<T> {
  /** Rows whose key is no more. */
  gone: T[];
  /** Rows that are new, or that have another content under their key. */
  changed: T[];
}

/**
 * Compares two sets of rows by key and content, so that only what changed is written. Rows of one
 * set have distinct keys; fields are compared as JSON, whatever their order.
 */
export function difference<T extends object>(
  before: readonly T[],
  after: readonly T[],
  keyOf: (row: T) => string,
): Difference<T> {
  const was = new Map(before.map((row) => [keyOf(row), textOf(row)]));
  const is = new Set(after.map(keyOf));
  return {
    gone: before.filter((row) => !is.has(keyOf(row))),
    changed: after.filter((row) => was.get(keyOf(row)) !== textOf(row)),
  };
}

function textOf(row: object): string {
  return JSON.stringify(Object.entries(row).sort(([a], [b]) => (a < b ? -1 : 1)));
}
